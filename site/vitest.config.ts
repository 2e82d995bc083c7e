import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: { conditions: ['@ferrule/source'] },
  ssr: { resolve: { conditions: ['@ferrule/source'] } },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.spec.ts', 'src/**/*.spec.tsx'],
    setupFiles: ['src/testing/setup.ts'],
    css: false,
    testTimeout: 30_000,
  },
});
