import type { Review } from '@rimeward/contracts';
import { freshMemory, runRound, type DeliveryPorts } from '@rimeward/delivery';
import { beforeEach, describe, expect, it } from 'vitest';
import { codec } from '../codec';
import { database } from '../database/database';
import type { Enrolment } from '../database/schema';
import { browserClock } from '../delivery/browser-clock';
import { readReceipt } from '../delivery/receipt';
import { deliveryStore } from '../delivery/store';
import { httpTransport } from '../delivery/transport';
import { leaseStanding } from '../device/lease';
import { lockOnSignOut, unsentWork } from '../device/sign-out';
import { siteAccess } from '../queries/access';
import { entriesOfVisit, reviewsOfVisit, unreadableOfVisit } from '../queries/entries';
import { openQuestions } from '../queries/open-questions';
import { visitDays, visitDocument, visitsForDay } from '../queries/visits';
import { saveEntry } from '../save/save-entry';
import { freshDatabase } from '../testing/fresh-database';
import { Office } from '../testing/office';
import { enrolTechnician, noteOf, visitId } from '../testing/people';
import { storedEntryOf, visitOf } from '../testing/visit';

let office: Office;
let enrolment: Enrolment;

const ports = (): DeliveryPorts => ({
  clock: browserClock,
  random: Math.random,
  codec,
  store: deliveryStore(database(), enrolment.deviceId, enrolment.owner),
  transport: httpTransport(enrolment, office.fetch),
  readReceipt: (receipt) => readReceipt(receipt, enrolment),
  noteFault: (error) => {
    throw error;
  },
});

function leaseFor(device: string, hours: number): string {
  const { user, company } = enrolment;
  const iat = Math.floor(Date.now() / 1_000);
  return office.jws({
    typ: 'offline-lease',
    sub: user.id,
    company: company.id,
    device,
    iat,
    exp: iat + hours * 3_600,
  });
}

beforeEach(async () => {
  freshDatabase();
  office = new Office();
  enrolment = await enrolTechnician(1, { verifyKey: office.verifyKey });
  await database().devices.update(enrolment.deviceId, { lease: leaseFor(enrolment.deviceId, 72) });
  office.feed = [
    { kind: 'visit', id: visitId, document: visitOf(visitId, '2026-10-15', 2) },
    { kind: 'entry', entry: storedEntryOf(1, visitId) },
    { kind: 'entry', entry: storedEntryOf(2, visitId, { typeVersion: 99 }) },
    { kind: 'visit', id: enrolment.deviceId, document: visitOf(enrolment.deviceId, '2026-10-15', 1) },
    { kind: 'visit', id: enrolment.user.id, document: visitOf(enrolment.user.id, '2026-10-16') },
  ];
});

const review = (number: number, decision: Review['decision'], questionId: string): Review => ({
  id: `018f6b2a-0000-7000-8000-00000000e00${number}`,
  visitId,
  number,
  decision,
  remark: null,
  questions: [{ id: questionId, text: 'Which valve?', ruleId: null }],
  by: { id: enrolment.user.id, name: 'Supervisor' },
  at: '2026-10-16T06:00:00.000Z',
  seenPosition: 1,
});

describe('what was pulled', () => {
  it('answers by day in driving order and merges own and pulled entries, each once', async () => {
    await saveEntry(noteOf(1, 'mine'));
    await runRound(ports(), freshMemory());
    const own = (await database().entries.toArray())[0]!;
    office.feed.push({
      kind: 'entry',
      entry: { ...storedEntryOf(3, visitId), device: own.device, seq: 1, text: own.text },
    });
    await runRound(ports(), freshMemory());
    expect((await visitsForDay('2026-10-15')).map(({ sequence }) => sequence)).toEqual([1, 2]);
    expect(await visitDays()).toEqual(['2026-10-15', '2026-10-16']);
    expect((await entriesOfVisit(visitId)).length).toBe(2);
    expect(await unreadableOfVisit(visitId)).toBe(1);
  });

  it('keeps gate codes and access notes out of every stored document, and shows them under a good lease only', async () => {
    await runRound(ports(), freshMemory());
    const everything = JSON.stringify(await Promise.all(database().tables.map((table) => table.toArray())));
    expect(everything).not.toContain('4711');
    expect(everything).not.toContain('Dog in the yard');
    expect(await siteAccess(visitId)).toEqual({ accessNotes: 'Dog in the yard', gateCode: '4711' });
    await database().devices.update(enrolment.deviceId, { lease: leaseFor(enrolment.deviceId, -1) });
    expect(await siteAccess(visitId)).toEqual({ withheld: 'expired' });
    expect(await visitDocument(visitId)).toMatchObject({
      withheld: 'expired',
      customer: { name: '', phone: null },
    });
    expect((await saveEntry(noteOf(1, 'recording goes on'))).ok).toBe(true);
  });

  it.each([
    ["another phone's", () => leaseFor('018f6b2a-0000-7000-8000-0000000000aa', 72), 'other-device'],
    [
      'an edited',
      () =>
        leaseFor(enrolment.deviceId, 72).replace(
          /\.[^.]+\./,
          `.${Buffer.from('{"typ":"offline-lease","exp":9e9}').toString('base64url')}.`,
        ),
      'not-genuine',
    ],
    ['no', () => null, 'none'],
  ])('does not take %s lease', async (_, lease, why) => {
    await database().devices.update(enrolment.deviceId, { lease: lease() });
    expect(await leaseStanding()).toEqual({ good: false, why });
  });

  it('takes a clock set back for an expired lease, and a clock set forward for the time that it says', async () => {
    await runRound(ports(), freshMemory());
    const hour = 3_600_000;
    expect(await leaseStanding(database(), Date.now() - 3 * hour)).toEqual({
      good: false,
      why: 'clock-moved-back',
    });
    expect(await leaseStanding(database(), Date.now() + 71 * hour)).toMatchObject({ good: true });
    expect(await leaseStanding(database(), Date.now() + 365 * 24 * hour)).toEqual({
      good: false,
      why: 'expired',
    });
  });

  it('drops what was read, and nothing else, when the office begins a new epoch', async () => {
    await saveEntry(noteOf(1, 'mine'));
    await runRound(ports(), freshMemory());
    office.epoch = 'restored';
    office.feed = [{ kind: 'visit', id: visitId, document: visitOf(visitId, '2026-10-20') }];
    await runRound(ports(), freshMemory());
    expect(await visitsForDay('2026-10-15')).toEqual([]);
    expect((await visitsForDay('2026-10-20')).length).toBe(1);
    expect((await entriesOfVisit(visitId)).length).toBe(1);
  });

  it('opens questions of a visit sent back until they are answered or decided', async () => {
    const question = '018f6b2a-0000-7000-8000-00000000f001';
    office.feed.push({ kind: 'review', review: review(1, 'sent-back', question) });
    await runRound(ports(), freshMemory());
    expect((await openQuestions()).map(({ question: { id } }) => id)).toEqual([question]);
    const { actor, company } = noteOf(1, '');
    await saveEntry({
      visit: visitId,
      type: 'question-answered',
      body: { questionId: question, answer: 'The left one' },
      actor,
      company,
    });
    expect(await openQuestions()).toEqual([]);
    office.feed.push({ kind: 'review', review: review(2, 'accepted', question) });
    await runRound(ports(), freshMemory());
    expect((await reviewsOfVisit(visitId)).map(({ decision }) => decision)).toEqual([
      'sent-back',
      'accepted',
    ]);
  });

  it("leaves nothing read and no key after sign-out, and all of the unsent work, out of the next person's sight", async () => {
    await runRound(ports(), freshMemory());
    await saveEntry(noteOf(1, 'unsent'));
    await lockOnSignOut();
    const left = await Promise.all([...database().readTables, database().keys].map((table) => table.count()));
    expect(left).toEqual([0, 0, 0, 0, 0]);
    expect((await unsentWork()).entries).toBe(0);
    await enrolTechnician(2);
    expect(await entriesOfVisit(visitId)).toEqual([]);
    await enrolTechnician(1);
    expect((await unsentWork()).entries).toBe(1);
    expect((await entriesOfVisit(visitId)).length).toBe(1);
  });

  it('does not write a page that was on its way when somebody else signed in', async () => {
    const late = ports();
    await enrolTechnician(2);
    expect(await runRound(late, freshMemory())).toMatchObject({ reason: null });
    expect(await database().read_visits.count()).toBe(0);
  });
});
