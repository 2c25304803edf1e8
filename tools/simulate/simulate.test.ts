import { describe, expect, it } from 'vitest';
import { Network } from './network';
import { Office } from './office/office';
import { Phone } from './phone/phone';
import { cloned } from './phone/phone-disk';
import { Seeded } from './random';
import { VirtualTime } from './virtual-time';
import { run } from './world';

const seeds = Number(process.env['SIMULATE_SEEDS'] ?? 12);
const first = Number(process.env['SIMULATE_FROM'] ?? 1);

it(`keeps every promise in ${seeds} histories from seed ${first}`, { timeout: 3_600_000 }, async () => {
  const failures: string[] = [];
  const sums = { entries: 0, photos: 0, kills: 0, restored: 0 };
  for (let seed = first; seed < first + seeds; seed += 1) {
    const result = await run(seed);
    sums.entries += result.entries;
    sums.photos += result.photos;
    sums.kills += result.kills;
    sums.restored += result.restored ? 1 : 0;
    failures.push(...result.breaches.map((breach) => `seed ${seed}: ${breach}`));
  }
  console.log(
    `${seeds} histories: ${sums.entries} entries, ${sums.photos} photographs, ${sums.kills} kills, ${sums.restored} restored offices`,
  );
  expect(failures).toEqual([]);
  expect(sums.entries).toBeGreaterThan(seeds * 50);
  expect(sums.photos).toBeGreaterThan(seeds);
});

it('repeats a history exactly from its seed', async () => {
  expect(await run(7)).toEqual(await run(7));
});

async function caught(flaws: Parameters<typeof run>[1], invariant: string): Promise<boolean> {
  for (let seed = 1; seed <= 10; seed += 1) {
    if ((await run(seed, flaws)).breaches.some((breach) => breach.startsWith(invariant))) return true;
  }
  return false;
}

it('catches an office that stores a push twice', { timeout: 600_000 }, async () => {
  expect(await caught({ pushWithoutIdempotency: true }, 'I2')).toBe(true);
});

it('catches a feed whose numbers are handed out before the commit', { timeout: 600_000 }, async () => {
  expect(await caught({ naiveCursor: true }, 'I5')).toBe(true);
});

it('catches an office that acknowledges before it has committed', { timeout: 600_000 }, async () => {
  expect(await caught({ answersBeforeCommit: true }, 'I6')).toBe(true);
});

describe('storage copied to a second phone', () => {
  /** An original that has delivered one entry, and a copy that has no network before `copyOfflineMs`. */
  async function twoPhones(copyOfflineMs: number) {
    const random = new Seeded(1);
    const time = new VirtualTime();
    const office = new Office(time, random);
    const original = new Phone(time, random, office, new Network(time, random), 1);
    original.open();
    await Promise.all([original.save(null), time.runUntil(60_000)]);
    const network = new Network(time, random);
    network.downUntilMs = copyOfflineMs;
    const copy = new Phone(time, random, office, network, 1, cloned(original.disk));
    copy.open();
    await Promise.all([original.save(null), copy.save(null), time.runUntil(600_000)]);
    return { office, original, copy };
  }

  // Online, the copy learns that the office is ahead before it sends anything; after a time without network it sends first.
  it.each([
    { offlineMs: 0, heldAtOffice: 0 },
    { offlineMs: 200_000, heldAtOffice: 1 },
  ])('stops the copy with a reason and loses nothing of either: %o', async ({ offlineMs, heldAtOffice }) => {
    const { office, original, copy } = await twoPhones(offlineMs);
    const reasons = [original, copy].map(({ lastStatus }) => lastStatus?.reason);
    expect(reasons.filter((reason) => reason === 'fork').length).toBe(1);
    const atOffice = office.disk.rows.map(({ text }) => text);
    for (const phone of [original, copy]) {
      for (const { text, seq } of phone.saved) {
        expect(atOffice.includes(text) || phone.disk.outbox.has(seq)).toBe(true);
      }
    }
    expect(office.disk.rows.filter(({ held }) => held === 'fork').length).toBe(heldAtOffice);
  });
});
