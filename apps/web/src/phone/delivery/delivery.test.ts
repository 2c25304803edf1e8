import { randomFillSync } from 'node:crypto';
import type { DeliveryPorts } from '@rimeward/delivery';
import { freshMemory, runRound } from '@rimeward/delivery';
import { beforeEach, describe, expect, it } from 'vitest';
import { codec } from '../codec';
import { database } from '../database/database';
import type { Enrolment } from '../database/schema';
import { unsentWork } from '../device/sign-out';
import { storePhoto } from '../photos/intake';
import { outboxItems } from '../queries/outbox';
import { photosOfVisit } from '../queries/photos';
import { saveEntry } from '../save/save-entry';
import { freshDatabase } from '../testing/fresh-database';
import { Office } from '../testing/office';
import { enrolTechnician, noteOf, visitId } from '../testing/people';
import { browserClock } from './browser-clock';
import { readReceipt } from './receipt';
import { deliveryStatus } from './status';
import { deliveryStore } from './store';
import { httpTransport } from './transport';

let office: Office;
let enrolment: Enrolment;
let ports: DeliveryPorts;

beforeEach(async () => {
  freshDatabase();
  office = new Office();
  enrolment = await enrolTechnician(1, { verifyKey: office.verifyKey });
  ports = {
    clock: browserClock,
    random: Math.random,
    codec,
    store: deliveryStore(database(), enrolment.deviceId, enrolment.owner),
    transport: httpTransport(enrolment, office.fetch),
    readReceipt: (receipt) => readReceipt(receipt, enrolment),
    noteFault: (error) => {
      throw error;
    },
  };
});

const texts = async (): Promise<string[]> => (await database().entries.toArray()).map(({ text }) => text);
const atTheOffice = (): string[] => (office.stored.get(enrolment.deviceId) ?? []).map(({ text }) => text);

function picture(bytes: number): Blob {
  const content = randomFillSync(new Uint8Array(bytes));
  content.set([0xff, 0xd8, 0xff, 0xe0]);
  return new Blob([content]);
}

async function notePicture(bytes: number): Promise<string> {
  const stored = await storePhoto(picture(bytes), { role: 'site', takenAt: null, source: 'camera' });
  if (!stored.ok) throw new Error(stored.fault);
  await saveEntry(noteOf(1, 'with a photograph', [stored.photo]));
  return stored.photo.sha256;
}

describe('a round of the phone', () => {
  it('brings entries and photographs byte for byte, as the device and compressed, and empties the outbox', async () => {
    for (let n = 0; n < 130; n += 1) await saveEntry(noteOf(1, `note ${n}`));
    const sha256 = await notePicture(600_000);
    expect(await runRound(ports, freshMemory())).toMatchObject({ reason: null, progressed: true });
    expect(atTheOffice()).toEqual(await texts());
    expect(office.complete.get(sha256)?.length).toBe(600_000);
    expect(await outboxItems()).toEqual([]);
    expect(await deliveryStatus()).toMatchObject({
      phase: 'idle',
      pendingEntries: 0,
      pendingPhotos: 0,
      pendingBytes: 0,
    });
    expect((await photosOfVisit(visitId)).map(({ standing }) => standing)).toEqual(['with-the-office']);
    const pushes = office.requests.filter(({ path }) => path === '/api/sync/push');
    expect(pushes.length).toBe(2);
    expect(pushes[0]).toMatchObject({
      authorization: `Device ${enrolment.deviceId}.secret`,
      encoding: 'gzip',
    });
  });

  it('keeps every outbox row when the answer is lost after the commit, and counts nothing twice afterwards', async () => {
    for (let n = 0; n < 5; n += 1) await saveEntry(noteOf(1, `note ${n}`));
    office.fault = (path) => (path === '/api/sync/push' ? 'lose-answer' : null);
    expect(await runRound(ports, freshMemory())).toMatchObject({ reason: 'no-network', contact: false });
    expect((await unsentWork()).entries).toBe(5);
    expect(atTheOffice().length).toBe(5);
    office.fault = () => null;
    await runRound(ports, freshMemory());
    expect(atTheOffice()).toEqual(await texts());
    expect((await unsentWork()).entries).toBe(0);
  });

  it('loses each answer of a whole delivery once, and still brings everything exactly once', async () => {
    for (let n = 0; n < 120; n += 1) await saveEntry(noteOf(1, `note ${n}`));
    const sha256 = await notePicture(700_000);
    const lost = new Set<string>();
    office.fault = (path) => {
      if (lost.has(path)) return null;
      lost.add(path);
      return 'lose-answer';
    };
    const memory = freshMemory();
    let rounds = 0;
    while ((await runRound(ports, memory)).reason !== null) if ((rounds += 1) > 30) break;
    expect(rounds).toBeLessThanOrEqual(30);
    expect(lost.size).toBeGreaterThan(5);
    expect(atTheOffice()).toEqual(await texts());
    expect(office.complete.has(sha256)).toBe(true);
    expect((await unsentWork()).entries).toBe(0);
  });

  it.each([
    [
      'a captive portal',
      new Response('<html>', { headers: { 'content-type': 'text/html' } }),
      'captive-portal',
    ],
    [
      'half an answer',
      new Response('{"acknow', { headers: { 'content-type': 'application/json' } }),
      'unreadable-answer',
    ],
    ['a busy office', new Response('', { status: 503, headers: { 'retry-after': '7' } }), 'server-busy'],
    [
      'a dead credential',
      new Response('{}', { status: 401, headers: { 'content-type': 'application/problem+json' } }),
      'sign-in',
    ],
  ])('takes no word for an acknowledgement from %s', async (_, answer, reason) => {
    await saveEntry(noteOf(1, 'note'));
    office.fault = () => answer.clone();
    const report = await runRound(ports, freshMemory());
    expect(report).toMatchObject({ reason, retryAfterMs: reason === 'server-busy' ? 7_000 : null });
    expect((await unsentWork()).entries).toBe(1);
    expect(await database().receipts.count()).toBe(0);
  });

  it('refills an office that was restored to an earlier day, photographs too', async () => {
    await notePicture(10_000);
    await saveEntry(noteOf(1, 'after the backup'));
    await runRound(ports, freshMemory());
    office.stored.set(enrolment.deviceId, []);
    office.complete.clear();
    office.parts.clear();
    await runRound(ports, freshMemory());
    expect(atTheOffice()).toEqual(await texts());
    await runRound(ports, freshMemory());
    expect(office.complete.size).toBe(1);
    expect((await unsentWork()).entries).toBe(0);
  });

  it('stops with a reason when the office has other entries under the same numbers', async () => {
    await saveEntry(noteOf(1, 'this phone'));
    office.stored.set(enrolment.deviceId, [{ text: '{"photos":[]}', hash: 'b'.repeat(64) }]);
    const memory = freshMemory();
    expect((await runRound(ports, memory)).reason).toBe('fork');
    expect(memory.forked).toBe(true);
    expect((await unsentWork()).entries).toBe(1);
  });

  it('lets one damaged photograph neither block the others nor disappear', async () => {
    const damaged = await notePicture(300_000);
    const whole = await notePicture(20_000);
    await database().chunks.delete([damaged, 1]);
    await runRound(ports, freshMemory());
    expect([...office.complete.keys()]).toEqual([whole]);
    expect(await outboxItems()).toMatchObject([
      { kind: 'photo', id: damaged, standing: 'held', why: 'damaged' },
    ]);
  });
});
