import { beforeEach, describe, expect, it } from 'vitest';
import { database } from '../database/database';
import { saveEntry } from '../save/save-entry';
import { apiFetch } from '../session/api-fetch';
import { renewSession } from '../session/renew';
import { freshDatabase } from '../testing/fresh-database';
import { noteOf, sessionOf } from '../testing/people';
import { enrolAnew, enterAs } from './enrol';
import { activeEnrolment } from './enrolment';
import { lockOnSignOut, unsentWork } from './sign-out';

beforeEach(freshDatabase);

const json = (body: unknown, status = 200): Response =>
  new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/json' } });

/** The part of the office that enrols, leases and renews. */
function office() {
  const asked: string[] = [];
  let devices = 0;
  const state = { signedIn: true, renewals: 0 };
  const fetcher: typeof fetch = (input, init) => {
    const path = input as string;
    asked.push(`${init?.method ?? 'GET'} ${path} ${new Headers(init?.headers).get('x-rimeward-request')}`);
    if (path === '/api/devices') {
      devices += 1;
      const deviceId = `018f6b2a-0000-7000-8000-00000000d10${devices}`;
      return Promise.resolve(
        json({ deviceId, ingestSecret: 's', lease: 'first', verifyKey: { kty: 'EC' } }, 201),
      );
    }
    if (path.endsWith('/lease'))
      return Promise.resolve(json({ lease: 'renewed', verifyKey: { kty: 'EC', x: '2' } }));
    if (path === '/api/auth/renew') {
      state.renewals += 1;
      state.signedIn = true;
      return new Promise((resolve) => setTimeout(() => resolve(json(sessionOf(1))), 20));
    }
    return Promise.resolve(state.signedIn ? json({}) : json({ code: 'not-signed-in' }, 401));
  };
  return { fetcher, asked, state };
}

describe('enterAs', () => {
  it('enrols once for each person, and takes the same device up again with everything unsent on it', async () => {
    const { fetcher, asked } = office();
    const first = await enterAs(sessionOf(1), fetcher);
    await saveEntry(noteOf(1, 'unsent'));
    await lockOnSignOut();
    expect(await activeEnrolment()).toBeNull();
    const second = await enterAs(sessionOf(2), fetcher);
    expect((await unsentWork()).entries).toBe(0);
    const again = await enterAs(sessionOf(1), fetcher);
    expect((await unsentWork()).entries).toBe(1);
    expect([first, again].map((result) => result.ok && result.device.deviceId)).toEqual([
      '018f6b2a-0000-7000-8000-00000000d101',
      '018f6b2a-0000-7000-8000-00000000d101',
    ]);
    expect(second.ok && second.device.deviceId).toBe('018f6b2a-0000-7000-8000-00000000d102');
    expect(again.ok && again.device.lease).toBe('renewed');
    expect(asked.filter((line) => line === 'POST /api/devices 1').length).toBe(2);
  });

  it.each([
    ['no network', () => Promise.reject(new TypeError('network')), 'unreachable'],
    [
      'a portal',
      () => Promise.resolve(new Response('<html>', { headers: { 'content-type': 'text/html' } })),
      'unreachable',
    ],
    ['a dead session', () => Promise.resolve(json({}, 401)), 'not-signed-in'],
    ['a refusal', () => Promise.resolve(json({}, 403)), 'refused'],
    [
      'half an answer',
      () => Promise.resolve(new Response('{"devi', { headers: { 'content-type': 'application/json' } })),
      'unreachable',
    ],
  ])('says so when there is %s, and activates nobody', async (_, fetcher, fault) => {
    expect(await enterAs(sessionOf(1), fetcher)).toEqual({ ok: false, fault });
    expect(await activeEnrolment()).toBeNull();
  });

  it('leaves a device behind for a new one and keeps what is on it', async () => {
    const { fetcher } = office();
    await enterAs(sessionOf(1), fetcher);
    await saveEntry(noteOf(1, 'on the first device'));
    const anew = await enrolAnew(sessionOf(1), fetcher);
    expect(anew.ok && anew.device.deviceId).toBe('018f6b2a-0000-7000-8000-00000000d102');
    await saveEntry(noteOf(1, 'on the second'));
    const rows = await database().entries.toArray();
    expect(rows.map(({ device, seq }) => [device.slice(-1), seq])).toEqual([
      ['1', 1],
      ['2', 1],
    ]);
  });
});

describe('the session', () => {
  it('is renewed once for all who meet a 401 at the same time, and each request is made again', async () => {
    const { fetcher, state } = office();
    state.signedIn = false;
    const answers = await Promise.all(Array.from({ length: 10 }, () => apiFetch('/api/visits', {}, fetcher)));
    expect(answers.map((answer) => answer?.status)).toEqual(Array.from({ length: 10 }, () => 200));
    expect(state.renewals).toBe(1);
  });

  it('is over only when the office says so', async () => {
    expect(await renewSession(() => Promise.resolve(json({ code: 'session-ended' }, 401)))).toEqual({
      ok: false,
      fault: 'sign-in',
    });
    for (const answer of [
      json({}, 500),
      json({}),
      new Response('<html>', { headers: { 'content-type': 'text/html' } }),
    ]) {
      expect(await renewSession(() => Promise.resolve(answer))).toEqual({ ok: false, fault: 'unreachable' });
    }
  });
});
