import { clockKey, clockOf } from '../clock/known-time';
import type { ActiveRow, EntryRow, MetaRow, PhotoRow } from '../database/schema';
import { chainStart, markOf } from '../delivery/chain-marks';
import { activeKey, ownerOf } from '../device/enrolment';
import type { NewEntry } from './entry-draft';
import { entryRow } from './entry-row';
import { rememberHead, takeKnownHead, type KnownHead } from './known-head';
import { SaveRefused } from './save-refused';
import { strictTransaction } from './strict-transaction';

export interface Written {
  row: EntryRow;
  photos: PhotoRow[];
}

/**
 * Writes an entry at the end of the chain and settles when the browser has committed. On top of a known head this is one
 * request: the key (device, number) can be taken only once, so a tab that was overtaken is refused, and reads. Reading,
 * the sealing happens inside the transaction. Either way no two tabs can take one number.
 */
export async function writeEntry(idb: IDBDatabase, entry: NewEntry, wallMs: number): Promise<Written> {
  const guess = takeKnownHead(ownerOf(entry.company, entry.actor), wallMs);
  const direct =
    guess !== null && (entry.photos ?? []).length === 0 ? await onTopOf(idb, entry, wallMs, guess) : null;
  return direct ?? readThenWrite(idb, entry, wallMs);
}

/** Null when the number is taken. */
async function onTopOf(
  idb: IDBDatabase,
  entry: NewEntry,
  wallMs: number,
  { owner, device, head, clock }: KnownHead,
): Promise<Written | null> {
  const row = entryRow(entry, device, head, clock, wallMs);
  try {
    await strictTransaction(idb, ['entries'], (transaction) => {
      transaction.objectStore('entries').add(row);
      transaction.commit();
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'ConstraintError') return null;
    throw error;
  }
  rememberHead({ owner, device, head: markOf(row), clock }, wallMs);
  return { row, photos: [] };
}

async function readThenWrite(idb: IDBDatabase, entry: NewEntry, wallMs: number): Promise<Written> {
  const shas = (entry.photos ?? []).map(({ sha256 }) => sha256);
  const done: { written?: Written; known?: KnownHead } = {};
  await strictTransaction(idb, ['meta', 'entries', 'photos'], (transaction, guard) => {
    const meta = transaction.objectStore('meta');
    const entries = transaction.objectStore('entries');
    const photos = transaction.objectStore('photos');
    const active = meta.get(activeKey) as IDBRequest<ActiveRow | undefined>;
    const clock = meta.get(clockKey) as IDBRequest<MetaRow | undefined>;
    clock.onsuccess = guard(() => {
      const device = permitted(active.result, entry);
      const found = shas.map((sha256) => photos.get([device, sha256]) as IDBRequest<PhotoRow | undefined>);
      const newest = entries.openCursor(IDBKeyRange.bound([device, 0], [device, Infinity]), 'prev');
      newest.onsuccess = guard(() => {
        const last = newest.result?.value as EntryRow | undefined;
        const knowledge = clockOf(clock.result);
        const head = last === undefined ? chainStart : markOf(last);
        const row = entryRow(entry, device, head, knowledge, wallMs);
        const named = found.map(({ result }) => namedIn(result, entry.visit));
        entries.add(row);
        for (const photo of named) photos.put(photo);
        transaction.commit();
        done.written = { row, photos: named };
        done.known = { owner: row.owner, device, head: markOf(row), clock: knowledge };
      });
    });
  });
  if (done.written === undefined || done.known === undefined) throw new Error('committed without an entry');
  rememberHead(done.known, wallMs);
  return done.written;
}

function permitted(active: ActiveRow | undefined, entry: NewEntry): string {
  if (active === undefined) throw new SaveRefused('not-enrolled');
  if (active.owner !== ownerOf(entry.company, entry.actor)) throw new SaveRefused('other-person');
  return active.value;
}

function namedIn(photo: PhotoRow | undefined, visit: string): PhotoRow {
  if (photo === undefined || photo.state === 'storing') throw new SaveRefused('photo-missing');
  return { ...photo, visit: photo.visit ?? visit, state: photo.state === 'loose' ? 'pending' : photo.state };
}
