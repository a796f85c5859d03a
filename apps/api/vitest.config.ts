import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    name: 'api',
    include: ['src/**/*.test.ts'],
    // Reading the whole application in takes longer than most tests; each shop has a database of its own.
    isolate: false,
    testTimeout: 60_000,
    hookTimeout: 60_000,
  },
});
