import { defineConfig } from 'vitest/config';

/** Browser tests: real Chromium against the built product on a database of its own, one file at a time. */
export default defineConfig({
  test: {
    name: 'browser',
    root: import.meta.dirname,
    include: ['**/*.test.ts'],
    fileParallelism: false,
    maxWorkers: 1,
    bail: 1,
    testTimeout: 240_000,
    hookTimeout: 120_000,
  },
});
