import assert from 'node:assert/strict';
import { once } from 'node:events';
import { createServer } from 'node:net';
import { test } from 'node:test';
import { freePort, portFrom, portOf } from '../../lib/ports.mjs';
import { Fault } from '../../lib/say.mjs';

test('a port in use gives way to the next free one', async () => {
  const taken = createServer().listen(await freePort(), '127.0.0.1');
  await once(taken, 'listening');
  const { port } = taken.address();
  const got = await portFrom(port);
  assert.ok(got > port && got < port + 50);
  taken.close();
});

test('a free port is taken as wanted', async () => {
  const port = await freePort();
  assert.equal(await portFrom(port), port);
});

test('PORT is a whole number from 1 to 65535, or the default', () => {
  assert.equal(portOf(undefined, 4180), 4180);
  assert.equal(portOf('', 4180), 4180);
  assert.equal(portOf('8080', 4180), 8080);
  for (const wrong of ['0', '65536', '80.5', 'web', '-1']) assert.throws(() => portOf(wrong, 4180), Fault);
});
