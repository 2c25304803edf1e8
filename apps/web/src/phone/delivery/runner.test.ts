import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { lockOnSignOut, unsentWork } from '../device/sign-out';
import { saveEntry } from '../save/save-entry';
import { freshDatabase } from '../testing/fresh-database';
import { Office } from '../testing/office';
import { enrolTechnician, noteOf } from '../testing/people';
import { deliverNow, startDelivery } from './runner';
import { deliveryStatus } from './status';

let office: Office;
let stop: () => void = () => undefined;

beforeEach(() => {
  freshDatabase();
  office = new Office();
  vi.stubGlobal('fetch', office.fetch);
});
afterEach(async () => {
  stop();
  // The running round ends by itself; the next test takes the database away.
  await new Promise((resolve) => setTimeout(resolve, 150));
  vi.unstubAllGlobals();
});

const stored = (device: string): number => office.stored.get(device)?.length ?? 0;

describe('startDelivery', () => {
  it('brings what is saved without being asked, and says when it last spoke with the office', async () => {
    const { deviceId } = await enrolTechnician(1, { verifyKey: office.verifyKey });
    stop = startDelivery();
    await saveEntry(noteOf(1, 'one'));
    await vi.waitFor(() => expect(stored(deviceId)).toBe(1), 5_000);
    await vi.waitFor(
      async () =>
        expect(await deliveryStatus()).toMatchObject({ phase: 'idle', pendingEntries: 0, reason: null }),
      5_000,
    );
    // Contact is told at the end of a round, after the feed has been read.
    await vi.waitFor(
      async () => expect((await deliveryStatus()).lastContactMs ?? 0).toBeGreaterThan(Date.now() - 10_000),
      5_000,
    );
  });

  it('says why something is still here, and tries again at once when asked by hand', async () => {
    const { deviceId } = await enrolTechnician(1, { verifyKey: office.verifyKey });
    office.fault = () =>
      new Response('{}', {
        status: 503,
        headers: { 'content-type': 'application/json', 'retry-after': '300' },
      });
    await saveEntry(noteOf(1, 'one'));
    stop = startDelivery();
    await vi.waitFor(
      async () =>
        expect(await deliveryStatus()).toMatchObject({
          phase: 'waiting',
          reason: 'server-busy',
          pendingEntries: 1,
        }),
      5_000,
    );
    expect((await deliveryStatus()).nextTryMs).toBeGreaterThan(Date.now() + 250_000);
    office.fault = () => null;
    await deliverNow();
    await vi.waitFor(() => expect(stored(deviceId)).toBe(1), 5_000);
  });

  it('follows sign-in and sign-out: nobody else sends what one person has left', async () => {
    const first = await enrolTechnician(1, { verifyKey: office.verifyKey });
    office.fault = () => 'lose-request';
    stop = startDelivery();
    await saveEntry(noteOf(1, 'left by the first'));
    await lockOnSignOut();
    await vi.waitFor(async () => expect(await deliveryStatus()).toMatchObject({ phase: 'stopped' }), 5_000);
    office.fault = () => null;
    const second = await enrolTechnician(2, { verifyKey: office.verifyKey });
    await saveEntry(noteOf(2, 'by the second'));
    await vi.waitFor(() => expect(stored(second.deviceId)).toBe(1), 5_000);
    expect(stored(first.deviceId)).toBe(0);
    await enrolTechnician(1, { verifyKey: office.verifyKey });
    await vi.waitFor(() => expect(stored(first.deviceId)).toBe(1), 5_000);
    await vi.waitFor(async () => expect((await unsentWork()).entries).toBe(0), 5_000);
  });
});
