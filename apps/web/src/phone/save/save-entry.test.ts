import { emptyChain, verifyChain } from '@rimeward/delivery';
import { entryTypes, envelopeSchema } from '@rimeward/field-log';
import { liveQuery } from 'dexie';
import { IDBDatabase, IDBObjectStore } from 'fake-indexeddb';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { codec } from '../codec';
import { database } from '../database/database';
import type { EntryRow } from '../database/schema';
import { unsentWork } from '../device/sign-out';
import { storePhoto } from '../photos/intake';
import { entriesOfVisit } from '../queries/entries';
import { freshDatabase } from '../testing/fresh-database';
import { enrolTechnician, noteOf, visitId } from '../testing/people';
import { saveEntry } from './save-entry';
import { typeVersions } from './type-versions';

beforeEach(freshDatabase);
afterEach(() => vi.restoreAllMocks());

describe('saveEntry', () => {
  it('writes at the end of the chain, which verifies, and into the outbox', async () => {
    const { deviceId } = await enrolTechnician(1);
    for (const text of ['one', 'two', 'three']) expect((await saveEntry(noteOf(1, text))).ok).toBe(true);
    const rows = await database().entries.toArray();
    expect(verifyChain(deviceId, emptyChain, rows, codec)).toEqual({
      ok: true,
      head: { seq: 3, hash: rows[2]?.hash },
    });
    const bytes = rows.reduce((sum, row) => sum + new TextEncoder().encode(row.text).length, 0);
    expect(await unsentWork()).toEqual({ entries: 3, photos: 0, bytes, held: 0 });
  });

  it('shows an entry to live queries once it is committed, and its photograph as waiting', async () => {
    await enrolTechnician(1);
    const stored = await storePhoto(new Blob([new Uint8Array([0xff, 0xd8, 0xff, 0])]), {
      role: 'site',
      takenAt: null,
      source: 'camera',
    });
    if (!stored.ok) throw new Error(stored.fault);
    const counts: number[][] = [];
    const watching = liveQuery(async () => [
      (await entriesOfVisit(visitId)).length,
      (await unsentWork()).photos,
    ]).subscribe((count) => counts.push(count));
    await vi.waitFor(() => expect(counts.at(-1)).toEqual([0, 0]));
    await saveEntry(noteOf(1, 'one', [stored.photo]));
    await vi.waitFor(() => expect(counts.at(-1)).toEqual([1, 1]));
    watching.unsubscribe();
  });

  it('writes an envelope that the shared schema takes', async () => {
    await enrolTechnician(1);
    const saved = await saveEntry(noteOf(1, 'text with a cut emoji \ud83d'));
    expect(saved.ok && envelopeSchema.safeParse(saved.entry).success).toBe(true);
    expect(saved.ok && saved.entry.body).toEqual({ text: 'text with a cut emoji \ufffd' });
  });

  it('asks the browser for strict durability', async () => {
    const transaction = vi.spyOn(IDBDatabase.prototype, 'transaction');
    await enrolTechnician(1);
    await saveEntry(noteOf(1, 'reads the head first'));
    await saveEntry(noteOf(1, 'knows it'));
    const writing = transaction.mock.calls.filter(
      ([tables, mode]) => mode === 'readwrite' && [...(tables as string[])].includes('entries'),
    );
    expect(writing.map(([, , options]) => options)).toEqual([
      { durability: 'strict' },
      { durability: 'strict' },
    ]);
  });

  it('gives 200 entries of two tabs 200 numbers without a gap', async () => {
    const { deviceId } = await enrolTechnician(1);
    const own = await database().open();
    vi.resetModules();
    const otherTab = await import('./save-entry');
    const save = (index: number) =>
      (index % 2 === 0 ? saveEntry : otherTab.saveEntry)(noteOf(1, `note ${index}`));
    const results = await Promise.all(Array.from({ length: 200 }, (_, index) => save(index)));
    expect(results.every(({ ok }) => ok)).toBe(true);
    const rows = (await own.table('entries').toArray()) as EntryRow[];
    expect(rows.map(({ seq }) => seq)).toEqual(Array.from({ length: 200 }, (_, index) => index + 1));
    expect(verifyChain(deviceId, emptyChain, rows, codec).ok).toBe(true);
    (await import('../database/database')).closeDatabase();
  });

  it('refuses another person, an unknown photograph, too much text, and nobody, and leaves nothing behind', async () => {
    expect(await saveEntry(noteOf(1, 'x'))).toEqual({ ok: false, fault: 'not-enrolled' });
    await enrolTechnician(1);
    expect(await saveEntry(noteOf(2, 'x'))).toEqual({ ok: false, fault: 'other-person' });
    expect(await saveEntry(noteOf(1, 'x'.repeat(70_000)))).toEqual({ ok: false, fault: 'too-large' });
    const photo = {
      sha256: 'a'.repeat(64),
      bytes: 1,
      type: 'image/jpeg',
      role: 'site',
      takenAt: null,
      source: 'camera',
    } as const;
    expect(await saveEntry(noteOf(1, 'x', [photo]))).toEqual({ ok: false, fault: 'photo-missing' });
    expect(await database().entries.count()).toBe(0);
  });

  it('gives the ballast up for text when the phone is full, and reports a full phone when there is none left', async () => {
    await enrolTechnician(1);
    await database().ballast.put({ n: 0, bytes: new ArrayBuffer(8) });
    const full = refuseEntriesUntilBallastGoes();
    expect((await saveEntry(noteOf(1, 'fits after all'))).ok).toBe(true);
    expect(await database().ballast.count()).toBe(0);
    full.always();
    expect(await saveEntry(noteOf(1, 'no room'))).toEqual({ ok: false, fault: 'storage-full' });
    expect((await database().entries.toArray()).map(({ visit }) => visit)).toEqual([visitId]);
  });

  it('knows the newest version of every entry type', () => {
    const registry = Object.fromEntries(
      Object.entries(entryTypes).map(([type, { version }]) => [type, version]),
    );
    expect(typeVersions).toEqual(registry);
  });
});

/** Makes the browser refuse entries as a full one does: until the ballast is cleared, later always. */
function refuseEntriesUntilBallastGoes(): { always: () => void } {
  const state = { refuse: true };
  const add = IDBObjectStore.prototype.add;
  const clear = IDBObjectStore.prototype.clear;
  vi.spyOn(IDBObjectStore.prototype, 'clear').mockImplementation(function (this: IDBObjectStore) {
    if (this.name === 'ballast') state.refuse = false;
    return clear.call(this);
  });
  vi.spyOn(IDBObjectStore.prototype, 'add').mockImplementation(function (this: IDBObjectStore, ...args) {
    if (this.name === 'entries' && state.refuse) throw new DOMException('full', 'QuotaExceededError');
    return add.apply(this, args);
  });
  return {
    always: () => {
      state.refuse = true;
      vi.mocked(IDBObjectStore.prototype.clear).mockRestore();
    },
  };
}
