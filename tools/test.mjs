import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { build } from './lib/build.mjs';
import { installPackage } from './lib/debian.mjs';
import { checkNode, installPackages } from './lib/packages.mjs';
import { root } from './lib/paths.mjs';
import { Fault, run, say } from './lib/say.mjs';
import { startCluster } from './postgres/cluster.mjs';
import { steps } from './test/steps.mjs';

/** Sets up what the tests need, runs every step (or those named), and ends with one line of counts. */
run(async () => {
  checkNode();
  await installPackages();
  const wanted = process.argv.slice(2);
  const chosen = steps.filter(({ name, fast }) =>
    wanted.length === 0 ? true : wanted.includes('--fast') ? fast : wanted.includes(name),
  );
  if (chosen.length === 0)
    throw new Fault(`There is no such step. Steps: ${steps.map(({ name }) => name).join(', ')}.`);
  const needs = new Set(chosen.flatMap((step) => step.needs ?? []));

  mkdirSync(join(root, '.data'), { recursive: true });
  const folder = mkdtempSync(join(root, '.data', 'test-'));
  let cluster = null;
  const clean = async () => {
    await cluster?.stop();
    if (cluster && !cluster.folder.startsWith(folder))
      rmSync(cluster.folder, { recursive: true, force: true });
    rmSync(folder, { recursive: true, force: true });
  };
  for (const signal of ['SIGINT', 'SIGTERM'])
    process.on(signal, () => void clean().then(() => process.exit(1)));

  const env = { ...process.env, CHROMIUM_PATH: '/usr/bin/chromium', TEST_WORK_DIR: folder };
  let passed = 0;
  let failed = 0;
  try {
    if (needs.has('chromium') && !existsSync(env.CHROMIUM_PATH)) await installPackage('chromium', 'Chromium');
    if (needs.has('postgres')) {
      cluster = await startCluster({ dataDir: folder, superPassword: 'postgres-in-tests', durable: false });
      env.TEST_POSTGRES_ADMIN_URL = cluster.adminUrl;
    }
    if (needs.has('build')) await build();
    for (const step of chosen) {
      const began = Date.now();
      const result = await step.run(env, folder);
      passed += result.passed;
      failed += result.failed;
      if (result.output) say(result.output);
      say(
        `${step.name}: ${result.passed} passed, ${result.failed} failed, ${Math.round((Date.now() - began) / 1_000)} s`,
      );
    }
  } catch (error) {
    failed += 1;
    process.stderr.write(`${error instanceof Fault ? error.message : (error.stack ?? error)}\n`);
  } finally {
    await clean();
  }
  say(`${passed} passed, ${failed} failed`);
  process.exit(failed === 0 && passed > 0 ? 0 : 1);
});
