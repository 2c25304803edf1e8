import { join } from 'node:path';
import { root } from '../lib/paths.mjs';
import { runShown } from '../lib/processes.mjs';

/** Type checks of everything: libs and the API by reference, then tests, the web application, its worker, the browser tests. */
const projects = [
  ['-b', 'libs/contracts', 'libs/rules', 'libs/delivery', 'libs/trips', 'apps/api'],
  ['-p', 'tsconfig.tests.json'],
  ['-p', 'apps/api/tsconfig.spec.json'],
  ['-p', 'apps/web'],
  ['-p', 'apps/web/src/service-worker'],
  ['-p', 'apps/e2e'],
];

let failed = false;
for (const args of projects) {
  const code = await runShown(join(root, 'node_modules/.bin/tsc'), args, { cwd: root });
  failed ||= code !== 0;
}
process.exit(failed ? 1 : 0);
