import { defineConfig } from 'vitest/config';

/** The simulation: a few histories with every test run, many with `npm run simulate`. */
export default defineConfig({
  resolve: { conditions: ['source', 'module', 'node', 'development|production'] },
  ssr: { resolve: { conditions: ['source', 'module', 'node', 'development|production'] } },
  test: { name: 'simulate', root: import.meta.dirname, include: ['**/*.test.ts'], environment: 'node' },
});
