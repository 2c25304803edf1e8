import { defineConfig } from 'vitest/config';

/** Unit tests of the libs, read from source. */
export default defineConfig({
  resolve: { conditions: ['source', 'module', 'node', 'development|production'] },
  ssr: { resolve: { conditions: ['source', 'module', 'node', 'development|production'] } },
  test: {
    name: 'libs',
    root: import.meta.dirname,
    include: ['*/src/**/*.test.ts'],
    environment: 'node',
    // Loaded machines are slow; what hangs still ends.
    testTimeout: 60_000,
  },
});
