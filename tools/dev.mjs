import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { build } from './lib/build.mjs';
import { lockDataDir } from './lib/data-lock.mjs';
import { checkNode, installPackages } from './lib/packages.mjs';
import { root, startDataDir } from './lib/paths.mjs';
import { portFrom } from './lib/ports.mjs';
import { stopChild } from './lib/processes.mjs';
import { run, say } from './lib/say.mjs';
import { readSecrets } from './lib/secrets.mjs';
import { startCluster } from './postgres/cluster.mjs';
import { startProduct } from './product/product.mjs';

/** Hot reload on both sides: the compiler watches, the API starts again when its output changes, Vite serves the pages. */
run(async () => {
  checkNode();
  const dataDir = startDataDir();
  const unlock = lockDataDir(dataDir);
  await installPackages();
  await build(['api']);
  const cluster = await startCluster({ dataDir, superPassword: readSecrets(dataDir).superPassword });
  const pagesPort = await portFrom(5173);
  const origin = `http://127.0.0.1:${pagesPort}`;
  const product = await startProduct({
    adminUrl: cluster.adminUrl,
    dataDir,
    port: await portFrom(4180),
    seedDemo: true,
    env: { NODE_ENV: 'development', PUBLIC_ORIGIN: origin },
  });
  const compiler = spawn(
    join(root, 'node_modules/.bin/tsc'),
    ['-b', '-w', '--preserveWatchOutput', 'apps/api'],
    { cwd: root },
  );
  compiler.stdout.on('data', (part) => {
    process.stdout.write(part);
    if (String(part).includes('Found 0 errors')) void product.stopApi().then(() => product.startApi());
  });
  const pages = spawn(join(root, 'node_modules/.bin/vite'), ['--port', String(pagesPort), '--strictPort'], {
    cwd: join(root, 'apps/web'),
    stdio: 'inherit',
    env: { ...process.env, API_ORIGIN: product.origin },
  });
  say(`Pages at ${origin}, the API at ${product.origin}.`);
  const stop = async () => {
    await Promise.all([stopChild(compiler), stopChild(pages), product.stopApi()]);
    await cluster.stop();
    unlock();
    process.exit(0);
  };
  process.on('SIGINT', () => void stop());
  process.on('SIGTERM', () => void stop());
});
