import { defineConfig } from 'vitest/config';

/** Unit tests of the whole workspace: the libs and the web app, each with its own settings. */
export default defineConfig({
  test: {
    projects: ['libs/vitest.config.mts', 'apps/web/vitest.config.mts', 'tools/simulate/vitest.config.mts'],
  },
});
