export default {
  rootDir: '.',
  testEnvironment: 'node',
  testEnvironmentOptions: { customExportConditions: ['@ferrule/source', 'node', 'node-addons'] },
  extensionsToTreatAsEsm: ['.ts'],
  testMatch: ['<rootDir>/src/**/*.spec.ts', '<rootDir>/{bin,fakes}/**/*.spec.mjs'],
  globalSetup: '<rootDir>/test/global-setup.mjs',
  globalTeardown: '<rootDir>/test/global-teardown.mjs',
  setupFiles: ['<rootDir>/test/setup-metadata.ts'],
  testTimeout: 60_000,
  transform: {
    '^.+\\.ts$': [
      '@swc/jest',
      {
        jsc: {
          target: 'es2022',
          parser: { syntax: 'typescript', decorators: true },
          transform: {
            legacyDecorator: true,
            decoratorMetadata: true,
            useDefineForClassFields: false,
          },
          keepClassNames: true,
        },
        module: { type: 'es6' },
      },
    ],
  },
};
