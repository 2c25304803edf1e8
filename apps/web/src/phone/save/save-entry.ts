import { sealEntry } from '@rimeward/delivery';
import type { LogEntry } from '@rimeward/field-log';
import { clockKey, clockOf } from '../clock/known-time';
import { codec } from '../codec';
import { database, type PhoneDatabase } from '../database/database';
import { databaseFault, type DatabaseFault } from '../database/faults';
import { openPhone } from '../database/open-phone';
import type { EntryRow } from '../database/schema';
import { emptyChainRow } from '../delivery/chain-row';
import { wakeDelivery } from '../delivery/wake';
import { activeKey, ownerOf } from '../device/enrolment';
import { afterSave } from './after-save';
import { dropBallast } from './ballast';
import { entryDraft, type NewEntry } from './entry-draft';

export type { NewEntry } from './entry-draft';

/** Longest text that the office takes as one entry, UTF-16 units. */
const longestText = 64 * 1024;

export type SaveFault = 'not-enrolled' | 'other-person' | 'photo-missing' | 'too-large' | DatabaseFault;

export type SaveResult = { ok: true; entry: LogEntry } | { ok: false; fault: SaveFault };

/**
 * Writes one entry at the end of this device's chain. `ok` means that the browser has committed it with strict
 * durability; only then may a screen say "saved on this phone". A full phone gives up its ballast, a lost connection is
 * opened once again, before either is reported.
 */
export async function saveEntry(entry: NewEntry): Promise<SaveResult> {
  let result = await attempt(entry);
  if (!result.ok && result.fault === 'storage-full' && (await freeRoom())) result = await attempt(entry);
  if (!result.ok && result.fault === 'database-broken' && (await openPhone()).ok)
    result = await attempt(entry);
  if (result.ok) {
    wakeDelivery();
    afterSave();
  }
  return result;
}

async function freeRoom(): Promise<boolean> {
  try {
    return await dropBallast();
  } catch (error) {
    if (databaseFault(error) === null) throw error;
    return false;
  }
}

async function attempt(entry: NewEntry): Promise<SaveResult> {
  try {
    return await write(database(), entry, Date.now());
  } catch (error) {
    if (error instanceof SaveRefused) return { ok: false, fault: error.fault };
    const fault = databaseFault(error);
    if (fault === null) throw error;
    return { ok: false, fault };
  }
}

/** Thrown inside the transaction so that nothing of it stays. */
class SaveRefused extends Error {
  constructor(readonly fault: SaveFault) {
    super(fault);
  }
}

/**
 * One transaction: read the head, seal, write entry, outbox row, photographs' state and new head. Sealing happens inside
 * it, which synchronous hashing allows: two tabs can then neither take one number nor have to try again.
 */
function write(db: PhoneDatabase, entry: NewEntry, wallMs: number): Promise<SaveResult> {
  const photos = entry.photos ?? [];
  const tables = [
    db.meta,
    db.devices,
    db.chains,
    db.entries,
    db.outbox,
    ...(photos.length > 0 ? [db.photos] : []),
  ];
  return db.transaction('rw', tables, async (): Promise<SaveResult> => {
    const [active, clock] = await db.meta.bulkGet([activeKey, clockKey]);
    if (typeof active?.value !== 'string') throw new SaveRefused('not-enrolled');
    const device = active.value;
    const owner = ownerOf(entry.company, entry.actor);
    const [enrolment, chain = emptyChainRow(device)] = await Promise.all([
      db.devices.get(device),
      db.chains.get(device),
    ]);
    if (enrolment?.owner !== owner) throw new SaveRefused('other-person');

    const sealed = sealEntry(entryDraft(entry, device, clockOf(clock), wallMs), chain.head, codec);
    if (sealed.text.length > longestText) throw new SaveRefused('too-large');
    const parsed = JSON.parse(sealed.text) as LogEntry;
    const row: EntryRow = {
      device,
      seq: sealed.seq,
      id: parsed.id,
      owner,
      visit: entry.visit,
      text: sealed.text,
      hash: sealed.hash,
      byteLength: sealed.byteLength,
      bytesThrough: chain.head.bytesThrough + sealed.byteLength,
      entry: parsed,
      savedMs: wallMs,
    };
    const head = { seq: row.seq, hash: row.hash, bytesThrough: row.bytesThrough };
    await Promise.all([
      db.entries.add(row),
      db.outbox.add({ device, seq: row.seq }),
      db.chains.put({ ...chain, head }),
      ...photos.map(({ sha256 }) => nameInEntry(db, device, sha256, entry.visit)),
    ]);
    return { ok: true, entry: parsed };
  });
}

async function nameInEntry(db: PhoneDatabase, device: string, sha256: string, visit: string): Promise<void> {
  const photo = await db.photos.get([device, sha256]);
  if (photo === undefined || photo.state === 'storing') throw new SaveRefused('photo-missing');
  await db.photos.put({
    ...photo,
    visit: photo.visit ?? visit,
    state: photo.state === 'loose' ? 'pending' : photo.state,
  });
}
