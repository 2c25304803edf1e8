import { spawn } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { freePort } from '../lib/ports.mjs';
import { root } from '../lib/paths.mjs';
import { runKept, stopChild } from '../lib/processes.mjs';
import { Fault } from '../lib/say.mjs';
import { readSecrets } from '../lib/secrets.mjs';
import { dropDatabase, prepareDatabase } from '../postgres/database.mjs';
import { apiPidFile } from './leftover.mjs';

const api = join(root, 'apps/api/dist');
export const apiScript = join(api, 'main.js');

/**
 * The built product on a database of its own: migrated, seeded where asked, served. The API can be stopped and started again on
 * the same port, so that a test can take the office away and bring it back.
 */
export async function startProduct({
  adminUrl,
  dataDir,
  databaseName = 'rimeward',
  port,
  seedDemo = false,
  env = {},
}) {
  mkdirSync(dataDir, { recursive: true });
  const secrets = readSecrets(dataDir);
  const photoDir = join(dataDir, 'photos');
  mkdirSync(photoDir, { recursive: true });
  const urls = await prepareDatabase({ adminUrl, name: databaseName, passwords: secrets.passwords });
  const chosen = port ?? (await freePort());
  const origin = `http://127.0.0.1:${chosen}`;
  const environment = {
    ...process.env,
    NODE_ENV: 'production',
    HOST: '127.0.0.1',
    PORT: String(chosen),
    PUBLIC_ORIGIN: origin,
    DATABASE_URL: urls.appUrl,
    WEB_DIST_DIR: join(root, 'apps/web/dist'),
    PHOTO_DIR: photoDir,
    DATA_DIR: dataDir,
    SESSION_JWT_SECRET: secrets.sessionSecret,
    SIGNING_KEY_FILE: secrets.signingKeyFile,
    LOG_LEVEL: 'warn',
    ...env,
  };
  const migratorEnvironment = { ...environment, MIGRATION_DATABASE_URL: urls.migratorUrl };
  await step('The migrations', 'database/migrate.js', migratorEnvironment);
  if (seedDemo) await step('The demo company', 'demo/seed.js', migratorEnvironment);

  let child = null;
  const product = {
    origin,
    port: chosen,
    dataDir,
    photoDir,
    databaseUrl: urls.appUrl,
    adminDatabaseUrl: urls.adminUrl,
    migratorDatabaseUrl: urls.migratorUrl,
    accounts: readAccounts(dataDir),
    onDeath: null,
    get apiPid() {
      return child?.pid ?? null;
    },
    async startApi() {
      const started = spawn(process.execPath, [apiScript], {
        env: environment,
        stdio: ['ignore', 'inherit', 'inherit'],
      });
      child = started;
      writeFileSync(apiPidFile(dataDir), String(started.pid));
      started.once('exit', (code, signal) => {
        if (child === started) {
          child = null;
          product.onDeath?.(code ?? signal);
        }
      });
      await answering(origin, started);
    },
    async stopApi() {
      const running = child;
      child = null;
      if (running) await stopChild(running);
    },
    async killApi() {
      const running = child;
      child = null;
      if (running) await stopChild(running, 'SIGKILL');
    },
    /** Stops the API and drops the database. */
    async discard() {
      await product.stopApi();
      await dropDatabase(adminUrl, databaseName);
    },
  };
  await product.startApi();
  return product;
}

function readAccounts(dataDir) {
  const file = join(dataDir, 'demo-accounts.json');
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : [];
}

async function step(what, file, env) {
  const { code, output } = await runKept(process.execPath, [join(api, file)], { env });
  if (code !== 0) throw new Fault(`${what} failed: ${output.trim()}`);
}

async function answering(origin, child) {
  for (let tries = 0; tries < 300; tries += 1) {
    if (child.exitCode !== null)
      throw new Fault('The API stopped while starting; its own message stands above.');
    try {
      const response = await fetch(`${origin}/api/health`, { signal: AbortSignal.timeout(2_000) });
      if (response.ok) return;
    } catch {
      // Not listening yet.
    }
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Fault('The API does not answer.');
}
