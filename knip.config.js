/** Reads what a style sheet takes from packages, so that fonts count as used. */
const packagesOfStyleSheet = (text) =>
  [...text.matchAll(/(?:@import|url\()\s*['"]([@a-z.][^'"]+)['"]/g)]
    .map(([, specifier]) => `import '${specifier}';`)
    .join('\n');

// Debian's programs, which the tests ask for a second opinion.
const programsFromOutside = [
  'certutil',
  'chromium',
  'ngspice',
  'openssl',
  'pdfsig',
  'pdftoppm',
  'pdftotext',
  'qpdf',
  'units',
  'zbarimg',
];

export default {
  ignoreBinaries: programsFromOutside,
  // A type that only an exported function of its own file names is part of that function.
  ignoreExportsUsedInFile: { interface: true, type: true },
  compilers: { css: packagesOfStyleSheet },
  workspaces: {
    // The checks run the boundaries tool by its path.
    '.': { entry: [], ignoreDependencies: ['dependency-cruiser'] },
    assessments: {
      entry: ['src/**/*.spec.ts', 'test/**/*.spec.ts', 'test/worked-cases/*.ts'],
      // GNU units and ngspice, packages of the operating system.
      ignoreBinaries: ['units', 'ngspice'],
      project: ['src/**/*.ts', 'test/**/*.ts'],
    },
    certificates: {
      entry: ['src/**/*.spec.ts'],
      project: ['src/**/*.ts', 'test/**/*.ts'],
    },
    server: {
      entry: [
        'src/main.ts',
        'src/cli/*.ts',
        'src/**/*.spec.ts',
        'bin/{start,test,bench,remark,bank-audit,postgres}.mjs',
        'bin/bench/bare-server.mjs',
        'bin/bank-audit/worker.mjs',
        'bin/**/*.spec.mjs',
        'fakes/**/*.spec.mjs',
        'fakes/mail/sink.mjs',
      ],
      project: ['src/**/*.ts', 'test/**/*.{ts,mjs}', 'bin/**/*.mjs', 'fakes/**/*.mjs'],
    },
    site: {
      entry: ['src/**/*.spec.{ts,tsx}', 'e2e/**/*.spec.ts'],
      project: ['src/**/*.{ts,tsx,css}', 'e2e/**/*.ts', '*.ts'],
      ignore: ['src/api/schema.gen.ts'],
    },
  },
};
