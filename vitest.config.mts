import { defineConfig } from 'vitest/config';

/** Unit tests of the libs. The web app has its own project beside it (apps/web/vitest.config.ts). */
export default defineConfig({
  resolve: { conditions: ['source', 'module', 'node', 'development|production'] },
  ssr: { resolve: { conditions: ['source', 'module', 'node', 'development|production'] } },
  test: {
    projects: [
      {
        extends: true,
        test: { name: 'libs', root: 'libs', include: ['*/src/**/*.test.ts'], environment: 'node' },
      },
      'apps/web/vitest.config.ts',
    ],
  },
});
