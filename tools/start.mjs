import { build } from './lib/build.mjs';
import { lockDataDir } from './lib/data-lock.mjs';
import { checkNode, installPackages } from './lib/packages.mjs';
import { startDataDir } from './lib/paths.mjs';
import { portFrom, portOf } from './lib/ports.mjs';
import { run, say } from './lib/say.mjs';
import { readSecrets } from './lib/secrets.mjs';
import { startCluster } from './postgres/cluster.mjs';
import { stopLeftoverApi } from './product/leftover.mjs';
import { apiScript, startProduct } from './product/product.mjs';

const defaultPort = 4180;

/** Sets everything up and serves the product until it is told to stop. */
run(async () => {
  checkNode();
  const wanted = portOf(process.env.PORT, defaultPort);
  const dataDir = startDataDir();
  const unlock = lockDataDir(dataDir);
  await installPackages();
  await build();
  await stopLeftoverApi(dataDir, apiScript);
  const port = await portFrom(wanted);
  if (port !== wanted) say(`Port ${wanted} is in use; port ${port} is taken instead.`);
  let stopping = false;
  let cluster = null;
  let product = null;
  const stop = async (code) => {
    if (stopping) return;
    stopping = true;
    await product?.stopApi();
    await cluster?.stop();
    unlock();
    process.exit(code);
  };
  process.on('SIGINT', () => void stop(0));
  process.on('SIGTERM', () => void stop(0));

  const { superPassword } = readSecrets(dataDir);
  cluster = await startCluster({ dataDir, superPassword });
  cluster.child.once('exit', () => {
    if (!stopping) say('PostgreSQL has stopped by itself.');
    void stop(1);
  });

  try {
    product = await startProduct({
      adminUrl: cluster.adminUrl,
      dataDir,
      port,
      seedDemo: true,
      env: { LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn' },
    });
  } catch (error) {
    process.stderr.write(`${error.message}\n`);
    await stop(1);
    return;
  }
  product.onDeath = (how) => {
    say(`The API has stopped by itself (${how}).`);
    void stop(1);
  };
  say('');
  say(`Rimeward is served at ${product.origin}`);
  say('');
  say('The demo company can sign in as:');
  for (const { role, name, email, password } of product.accounts) {
    say(`  ${role.padEnd(10)}  ${email.padEnd(34)}  ${password.padEnd(26)}  ${name}`);
  }
  say('');
  say('Stop it with Ctrl+C.');
});
