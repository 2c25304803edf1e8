import { emptyChain, verifyChain } from '@rimeward/delivery';
import { entryTypes, envelopeSchema } from '@rimeward/field-log';
import { IDBDatabase, IDBObjectStore } from 'fake-indexeddb';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { codec } from '../codec';
import { database } from '../database/database';
import { freshDatabase } from '../testing/fresh-database';
import { enrolTechnician, noteOf, visitId } from '../testing/people';
import { saveEntry } from './save-entry';
import { typeVersions } from './type-versions';

beforeEach(freshDatabase);
afterEach(() => vi.restoreAllMocks());

describe('saveEntry', () => {
  it('writes entry, outbox row and head in one go, and the chain verifies', async () => {
    const { deviceId } = await enrolTechnician(1);
    for (const text of ['one', 'two', 'three']) expect((await saveEntry(noteOf(1, text))).ok).toBe(true);
    const rows = await database().entries.toArray();
    expect(verifyChain(deviceId, emptyChain, rows, codec)).toEqual({
      ok: true,
      head: { seq: 3, hash: rows[2]?.hash },
    });
    expect(await database().outbox.count()).toBe(3);
    expect((await database().chains.get(deviceId))?.head).toEqual({
      seq: 3,
      hash: rows[2]?.hash,
      bytesThrough: rows.reduce((sum, row) => sum + new TextEncoder().encode(row.text).length, 0),
    });
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
    await saveEntry(noteOf(1, 'one'));
    const writing = transaction.mock.calls.filter(
      ([tables, mode]) => mode === 'readwrite' && [...(tables as string[])].includes('entries'),
    );
    expect(writing.length).toBe(1);
    expect(writing[0]?.[2]).toEqual({ durability: 'strict' });
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
    const rows = await own.table('entries').toArray();
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
    expect([
      await database().entries.count(),
      await database().outbox.count(),
      await database().chains.count(),
    ]).toEqual([0, 0, 0]);
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
