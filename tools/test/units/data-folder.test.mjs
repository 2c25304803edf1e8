import assert from 'node:assert/strict';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, test } from 'node:test';
import { lockDataDir } from '../../lib/data-lock.mjs';
import { Fault } from '../../lib/say.mjs';
import { readSecrets } from '../../lib/secrets.mjs';
import { apiPidFile, stopLeftoverApi } from '../../product/leftover.mjs';

let folder;
const children = [];
beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'rimeward-data-'))));
afterEach(() => {
  for (const child of children.splice(0)) child.kill('SIGKILL');
  rmSync(folder, { recursive: true, force: true });
});

/** A process that runs the given script, which stays until it is told to stop. */
async function running(script, text = "setInterval(() => {}, 1000); console.log('up');") {
  writeFileSync(script, text);
  const child = spawn(process.execPath, [script], { stdio: ['ignore', 'pipe', 'inherit'] });
  children.push(child);
  await once(child.stdout, 'data');
  return child;
}

test('a second launcher is told who holds the data folder', async () => {
  mkdirSync(join(folder, 'tools'));
  const first = await running(join(folder, 'tools', 'start.mjs'));
  writeFileSync(join(folder, 'launcher.pid'), String(first.pid));
  assert.throws(
    () => lockDataDir(folder),
    (error) => error instanceof Fault && error.message.includes(`process ${first.pid}`),
  );
});

test('the lock of a killed launcher does not count', async () => {
  mkdirSync(join(folder, 'tools'));
  const first = await running(join(folder, 'tools', 'start.mjs'));
  writeFileSync(join(folder, 'launcher.pid'), String(first.pid));
  first.kill('SIGKILL');
  await once(first, 'exit');
  const unlock = lockDataDir(folder);
  assert.equal(readFileSync(join(folder, 'launcher.pid'), 'utf8'), String(process.pid));
  unlock();
  assert.equal(existsSync(join(folder, 'launcher.pid')), false);
});

test('secrets are made once, for their owner alone, and the same ever after', () => {
  const made = readSecrets(folder);
  assert.deepEqual(readSecrets(folder), made);
  assert.equal(statSync(join(folder, 'secrets.json')).mode & 0o777, 0o600);
  assert.equal(statSync(made.signingKeyFile).mode & 0o777, 0o600);
  assert.equal(new Set([made.superPassword, ...Object.values(made.passwords), made.sessionSecret]).size, 4);
});

test('an API left behind by a killed launcher is stopped', async () => {
  const script = join(folder, 'main.js');
  const left = await running(script);
  writeFileSync(apiPidFile(folder), String(left.pid));
  const gone = once(left, 'exit');
  assert.equal(await stopLeftoverApi(folder, script), true);
  await gone;
  assert.equal(existsSync(apiPidFile(folder)), false);
});

test('an API left behind that does not listen is killed', async () => {
  const script = join(folder, 'main.js');
  const deaf = "process.on('SIGTERM', () => {}); setInterval(() => {}, 1000); console.log('up');";
  const left = await running(script, deaf);
  writeFileSync(apiPidFile(folder), String(left.pid));
  const gone = once(left, 'exit');
  await stopLeftoverApi(folder, script, 200);
  assert.deepEqual(await gone, [null, 'SIGKILL']);
});

test('another program that got the same process id is left alone', async () => {
  const other = await running(join(folder, 'other.js'));
  writeFileSync(apiPidFile(folder), String(other.pid));
  assert.equal(await stopLeftoverApi(folder, join(folder, 'main.js')), false);
  assert.equal(other.exitCode ?? other.signalCode, null);
});
