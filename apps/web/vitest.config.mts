import { defineConfig } from 'vitest/config';

/** Unit tests of the web app: the phone folder in Node with an IndexedDB, components in jsdom. */
export default defineConfig({
  resolve: { conditions: ['source', 'module', 'browser', 'development|production'] },
  ssr: { resolve: { conditions: ['source', 'module', 'node', 'development|production'] } },
  test: {
    name: 'web',
    root: import.meta.dirname,
    include: ['src/**/*.test.ts', 'src/**/*.test.tsx'],
    environment: 'node',
    // Loaded machines are slow; what hangs still ends.
    testTimeout: 60_000,
    setupFiles: ['fake-indexeddb/auto'],
  },
});
