import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    include: ['src/**/*.spec.ts', 'test/**/*.spec.ts'],
    testTimeout: 60_000,
    // The library keeps no state, and loading mathjs anew for every file takes longer than the tests.
    isolate: false,
  },
});
