import assert from 'node:assert/strict';
import { once } from 'node:events';
import { chmodSync, existsSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { networkInterfaces, tmpdir } from 'node:os';
import { connect } from 'node:net';
import { join } from 'node:path';
import { after, afterEach, before, test } from 'node:test';
import { root } from '../../lib/paths.mjs';
import { startCluster } from '../../postgres/cluster.mjs';
import { prepareDatabase } from '../../postgres/database.mjs';

const { Client } = createRequire(join(root, 'apps/api/package.json'))('pg');
const superPassword = 'of-the-test';
let folder;
let cluster;
const start = async ({ dataDir = folder, durable = false } = {}) =>
  (cluster = await startCluster({ dataDir, superPassword, durable }));

async function ask(connectionString, text) {
  const client = new Client({ connectionString });
  await client.connect();
  try {
    return (await client.query(text)).rows;
  } finally {
    await client.end();
  }
}

before(() => {
  folder = mkdtempSync(join(tmpdir(), 'rimeward-cluster-'));
  chmodSync(folder, 0o755);
});
afterEach(() => cluster.stop());
after(() => {
  rmSync(folder, { recursive: true, force: true });
});

test('a half-made cluster is made anew', async () => {
  mkdirSync(join(folder, 'postgres', 'data.making'), { recursive: true });
  writeFileSync(join(folder, 'postgres', 'data.making', 'PG_VERSION'), '0');
  await start();
  assert.deepEqual(await ask(cluster.adminUrl, 'select 1 as one'), [{ one: 1 }]);
  assert.equal(cluster.folder, join(folder, 'postgres'));
  assert.equal(existsSync(join(cluster.folder, 'data.making')), false);
});

test('a password is needed, and only loopback is listened on', async () => {
  await start();
  const wrong = cluster.adminUrl.replace(superPassword, 'not-it');
  await assert.rejects(ask(wrong, 'select 1'), { code: '28P01' });
  const outside = Object.values(networkInterfaces())
    .flat()
    .filter(({ family, internal }) => family === 'IPv4' && !internal);
  for (const { address } of outside) {
    const [error] = await once(connect(cluster.port, address), 'error');
    assert.equal(error.code, 'ECONNREFUSED');
  }
});

test('what was written before the server was killed is there after the next start', async () => {
  await start({ durable: true });
  await ask(cluster.adminUrl, 'create table kept as select 7 as seven');
  cluster.child.kill('SIGKILL');
  await once(cluster.child, 'exit');
  await start();
  assert.deepEqual(await ask(cluster.adminUrl, 'select seven from kept'), [{ seven: 7 }]);
});

test('a data folder that PostgreSQL may not enter keeps its cluster elsewhere, found again at each start', async () => {
  const dataDir = mkdtempSync(join(folder, 'closed-'));
  await start({ dataDir });
  const first = cluster.folder;
  try {
    assert.equal(first.startsWith(dataDir), process.getuid() !== 0);
    await ask(cluster.adminUrl, 'create table kept_apart as select 7 as seven');
    await cluster.stop();
    await start({ dataDir });
    assert.deepEqual(await ask(cluster.adminUrl, 'select seven from kept_apart'), [{ seven: 7 }]);
    assert.equal(cluster.folder, first);
  } finally {
    await cluster.stop();
    rmSync(first, { recursive: true, force: true });
  }
});

test('a server that a killed launcher left running gives way to the next start', async () => {
  const { child } = await start();
  const gone = once(child, 'exit');
  await start();
  await gone;
  assert.deepEqual(await ask(cluster.adminUrl, 'select 1 as one'), [{ one: 1 }]);
});

test('the application owns nothing, and no other role may connect', async () => {
  await start();
  const passwords = { migrator: 'for-the-schema', app: 'for-the-rows' };
  const name = 'rimeward';
  await prepareDatabase({ adminUrl: cluster.adminUrl, name, passwords });
  const { appUrl, migratorUrl } = await prepareDatabase({ adminUrl: cluster.adminUrl, name, passwords });
  const [app] = await ask(
    appUrl,
    'select rolsuper, rolbypassrls, rolcreatedb, rolcreaterole from pg_roles where rolname = current_user',
  );
  assert.deepEqual(app, {
    rolsuper: false,
    rolbypassrls: false,
    rolcreatedb: false,
    rolcreaterole: false,
  });
  await assert.rejects(ask(appUrl, 'create table mine (one int)'), { code: '42501' });
  await ask(migratorUrl, 'create table theirs (one int)');
  await assert.rejects(ask(appUrl, 'select from theirs'), { code: '42501' });
  await ask(cluster.adminUrl, "create role stranger login password 'any'");
  const stranger = appUrl.replace('rimeward_app', 'stranger').replace(passwords.app, 'any');
  await assert.rejects(ask(stranger, 'select 1'), { code: '42501' });
});
