import { createHash, randomFillSync } from 'node:crypto';
import { photoLimits as contractLimits } from '@rimeward/contracts';
import { beforeEach, describe, expect, it } from 'vitest';
import { database } from '../database/database';
import { readDraft, writeDraft } from '../drafts';
import { tidy } from '../retention';
import { saveEntry } from '../save/save-entry';
import { freshDatabase } from '../testing/fresh-database';
import { enrolTechnician, noteOf } from '../testing/people';
import { photoLimits } from './limits';
import { storePhoto } from './intake';
import { readPhoto } from './read-photo';

const about = { role: 'site', takenAt: null, source: 'camera' } as const;
const heads = {
  'image/jpeg': [0xff, 0xd8, 0xff, 0xe1],
  'image/png': [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a],
  'image/webp': [...Buffer.from('RIFF\0\0\0\0WEBPVP8 ', 'latin1')],
  'image/heic': [...Buffer.from('\0\0\0\x18ftypheic\0\0\0\0mif1heic', 'latin1')],
} as const;

const picture = (bytes: number, head: readonly number[] = heads['image/jpeg']): Blob => {
  const content = randomFillSync(new Uint8Array(bytes));
  content.set(head);
  return new Blob([content], { type: 'text/plain' });
};

beforeEach(async () => {
  freshDatabase();
  await enrolTechnician(1);
});

describe('storePhoto', () => {
  it('goes by the limits of the contract', () => {
    expect(photoLimits).toEqual(contractLimits);
  });

  it.each(Object.entries(heads))('knows %s by its content and keeps it byte for byte', async (type, head) => {
    const file = picture(256 * 1024 * 2 + 17, head);
    const bytes = Buffer.from(await file.arrayBuffer());
    const stored = await storePhoto(file, about);
    const sha256 = createHash('sha256').update(bytes).digest('hex');
    expect(stored).toEqual({ ok: true, photo: { sha256, bytes: bytes.length, type, ...about } });
    expect((await database().chunks.toArray()).map((chunk) => chunk.bytes.byteLength)).toEqual([
      262_144, 262_144, 17,
    ]);
    const back = await readPhoto(sha256, 'original');
    expect(back?.type).toBe(type);
    expect(Buffer.from(await back!.arrayBuffer()).equals(bytes)).toBe(true);
  });

  it.each([
    ['nothing', new Blob([]), 'empty'],
    ["text under a picture's name", new Blob(['not a picture'], { type: 'image/jpeg' }), 'wrong-type'],
    [
      'a film in the same container',
      new Blob([Buffer.from('\0\0\0\x18ftypisom\0\0\0\0isommp42', 'latin1')]),
      'wrong-type',
    ],
    ['60 MB', picture(60 * 1024 * 1024), 'too-large'],
  ])('refuses %s with a reason and stores nothing', async (_, file, fault) => {
    expect(await storePhoto(file, about)).toEqual({ ok: false, fault });
    expect(await database().chunks.count()).toBe(0);
  });

  it('takes the same picture twice as one photograph', async () => {
    const file = picture(1_000);
    const first = await storePhoto(file, about);
    expect(await storePhoto(file, about)).toEqual(first);
    expect(await database().photos.count()).toBe(1);
  });

  it('repairs a photograph of which the phone has lost a chunk when the same picture comes again', async () => {
    const file = picture(300_000);
    const stored = await storePhoto(file, about);
    if (!stored.ok) throw new Error(stored.fault);
    await saveEntry(noteOf(1, 'x', [stored.photo]));
    await database().photos.toCollection().modify({ state: 'damaged' });
    await database().chunks.clear();
    await storePhoto(file, about);
    expect((await database().photos.toArray())[0]).toMatchObject({ state: 'pending' });
    expect(await database().chunks.count()).toBe(2);
  });
});

describe('tidy', () => {
  const day = 24 * 3_600_000;
  const counts = async (): Promise<number[]> =>
    Promise.all([database().photos.count(), database().chunks.count(), database().entries.count()]);

  it('collects photographs that nothing names after 48 h, and never one that an entry, a draft or an intent names', async () => {
    const [loose, drafted, named] = [picture(10), picture(11), picture(12)];
    await storePhoto(loose, about);
    const inDraft = await storePhoto(drafted, about);
    const inEntry = await storePhoto(named, about);
    if (!inDraft.ok || !inEntry.ok) throw new Error('not stored');
    await writeDraft('visit/1/note', { photos: [inDraft.photo] });
    await saveEntry(noteOf(1, 'x', [inEntry.photo]));
    await tidy(Date.now() + 47 * 3_600_000);
    expect(await counts()).toEqual([3, 3, 1]);
    await tidy(Date.now() + 400 * day);
    expect(await counts()).toEqual([2, 2, 1]);
    expect(await readDraft('visit/1/note')).toEqual({ photos: [inDraft.photo] });
  });

  it('keeps delivered entries for 30 days and photographs for 7, and entries without a verified receipt for ever', async () => {
    const { deviceId: device } = await enrolTechnician(1);
    const stored = await storePhoto(picture(10), about);
    if (!stored.ok) throw new Error(stored.fault);
    await saveEntry(noteOf(1, 'one', [stored.photo]));
    await saveEntry(noteOf(1, 'two'));
    await saveEntry(noteOf(1, 'three'));
    await database().chains.put({ device, acknowledged: { seq: 2, hash: 'b', bytesThrough: 0 } });
    await database().photos.toCollection().modify({ state: 'complete', settledMs: Date.now() });
    const receipt = { device, through: 1, hash: 'a', receipt: 'r', verified: false, atMs: Date.now() };
    await database().receipts.put(receipt);
    await tidy(Date.now() + 40 * day);
    expect(await counts()).toEqual([0, 0, 3]);
    await database().receipts.put({ ...receipt, verified: true });
    await tidy(Date.now() + 29 * day);
    expect((await counts())[2]).toBe(3);
    await tidy(Date.now() + 31 * day);
    expect((await database().entries.toArray()).map(({ seq }) => seq)).toEqual([2, 3]);
    // The newest entry is the head of the chain: it stays whatever covers it.
    await database().chains.put({ device, acknowledged: { seq: 3, hash: 'c', bytesThrough: 0 } });
    await database().receipts.put({ ...receipt, through: 3, verified: true });
    await tidy(Date.now() + 31 * day);
    expect((await database().entries.toArray()).map(({ seq }) => seq)).toEqual([3]);
    await saveEntry(noteOf(1, 'four'));
    expect((await database().entries.toArray()).map(({ seq }) => seq)).toEqual([3, 4]);
  });
});
