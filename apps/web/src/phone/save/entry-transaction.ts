import { sealEntry } from '@rimeward/delivery';
import type { LogEntry } from '@rimeward/field-log';
import { clockKey, clockOf } from '../clock/known-time';
import { codec } from '../codec';
import type { ActiveRow, EntryRow, MetaRow, PhotoRow } from '../database/schema';
import { chainStart, markOf } from '../delivery/chain-marks';
import { activeKey, ownerOf } from '../device/enrolment';
import { entryDraft, type NewEntry } from './entry-draft';

/** Longest text that the office takes as one entry, UTF-16 units. */
const longestText = 64 * 1024;

export type Refusal = 'not-enrolled' | 'other-person' | 'photo-missing' | 'too-large';

export interface Written {
  row: EntryRow;
  photos: PhotoRow[];
}

/** Thrown inside the transaction so that nothing of it stays. */
export class SaveRefused extends Error {
  constructor(readonly fault: Refusal) {
    super(fault);
  }
}

/** The device whose head was read last: a guess that lets everything be read in one go. */
let guess = '';

/**
 * One strict transaction, straight on IndexedDB: reads the head and who is active, seals, writes the entry and what it says
 * of its photographs, and commits without waiting for each answer. Sealing is synchronous and happens inside, so two tabs
 * can neither take one number nor have to try again. Settles when the browser has committed.
 */
export function writeEntry(idb: IDBDatabase, entry: NewEntry, wallMs: number): Promise<Written> {
  const shas = (entry.photos ?? []).map(({ sha256 }) => sha256);
  const stores = ['meta', 'entries', ...(shas.length > 0 ? ['photos'] : [])];
  return new Promise((resolve, reject) => {
    const transaction = idb.transaction(stores, 'readwrite', { durability: 'strict' });
    let written: Written | null = null;
    let failure: unknown = null;
    const guarded = (work: () => void) => (): void => {
      try {
        work();
      } catch (error) {
        failure = error;
        transaction.abort();
      }
    };
    transaction.oncomplete = () =>
      written === null ? reject(new Error('nothing was written')) : resolve(written);
    transaction.onabort = () =>
      reject(failure ?? transaction.error ?? new DOMException('aborted', 'AbortError'));

    const active = transaction.objectStore('meta').get(activeKey) as IDBRequest<ActiveRow | undefined>;
    const clock = transaction.objectStore('meta').get(clockKey) as IDBRequest<MetaRow | undefined>;
    const seal = (
      device: string,
      head: IDBRequest<IDBCursorWithValue | null>,
      photos: IDBRequest<PhotoRow | undefined>[],
    ) => {
      const last = head.result?.value as EntryRow | undefined;
      const row = nextEntry(entry, device, last, clockOf(clock.result), wallMs);
      const named = photos.map(({ result }) => namedIn(result, entry.visit));
      transaction.objectStore('entries').add(row);
      for (const photo of named) transaction.objectStore('photos').put(photo);
      written = { row, photos: named };
      transaction.commit();
    };
    const read = (device: string) => ({
      photos: shas.map(
        (sha256) =>
          transaction.objectStore('photos').get([device, sha256]) as IDBRequest<PhotoRow | undefined>,
      ),
      head: transaction
        .objectStore('entries')
        .openCursor(IDBKeyRange.bound([device, 0], [device, Infinity]), 'prev'),
    });
    const early = read(guess);
    early.head.onsuccess = guarded(() => {
      const device = permitted(active.result, entry);
      if (device === guess) return seal(device, early.head, early.photos);
      const late = read(device);
      late.head.onsuccess = guarded(() => {
        seal(device, late.head, late.photos);
        guess = device;
      });
    });
  });
}

function permitted(active: ActiveRow | undefined, entry: NewEntry): string {
  if (active === undefined) throw new SaveRefused('not-enrolled');
  if (active.owner !== ownerOf(entry.company, entry.actor)) throw new SaveRefused('other-person');
  return active.value;
}

function nextEntry(
  entry: NewEntry,
  device: string,
  last: EntryRow | undefined,
  clock: ReturnType<typeof clockOf>,
  wallMs: number,
): EntryRow {
  const head = last === undefined ? chainStart : markOf(last);
  const sealed = sealEntry(entryDraft(entry, device, clock, wallMs), head, codec);
  if (sealed.text.length > longestText) throw new SaveRefused('too-large');
  const parsed = JSON.parse(sealed.text) as LogEntry;
  return {
    ...sealed,
    device,
    id: parsed.id,
    owner: ownerOf(entry.company, entry.actor),
    visit: entry.visit,
    bytesThrough: head.bytesThrough + sealed.byteLength,
    entry: parsed,
    savedMs: wallMs,
  };
}

function namedIn(photo: PhotoRow | undefined, visit: string): PhotoRow {
  if (photo === undefined || photo.state === 'storing') throw new SaveRefused('photo-missing');
  return { ...photo, visit: photo.visit ?? visit, state: photo.state === 'loose' ? 'pending' : photo.state };
}
