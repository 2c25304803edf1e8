import { database, type PhoneDatabase } from '../database/database';
import { activeEnrolment, activeKey } from './enrolment';

export interface UnsentWork {
  entries: number;
  photos: number;
  /** Entries and photographs together. */
  bytes: number;
  /** With the office, kept aside for a person there. */
  held: number;
}

/** What of the active person's work the office does not have yet. Constant time, however much has been sent. */
export async function unsentWork(db: PhoneDatabase = database()): Promise<UnsentWork> {
  const enrolment = await activeEnrolment(db);
  if (enrolment === null) return { entries: 0, photos: 0, bytes: 0, held: 0 };
  const device = enrolment.deviceId;
  const [chain, photos, held] = await Promise.all([
    db.chains.get(device),
    db.photos.where({ device, state: 'pending' }).toArray(),
    db.entries.where('[device+heldReason]').between([device, ''], [device, '\uffff']).count(),
  ]);
  const entryBytes = chain === undefined ? 0 : chain.head.bytesThrough - chain.acknowledged.bytesThrough;
  return {
    entries: chain === undefined ? 0 : chain.head.seq - chain.acknowledged.seq,
    photos: photos.length,
    bytes: entryBytes + photos.reduce((sum, photo) => sum + photo.bytes, 0),
    held,
  };
}

/**
 * Signs this phone out: what was read and the keys to it go, with or without the office; entries, photographs and drafts
 * stay, locked for their person, and are sent when that person signs in again.
 */
export async function lockOnSignOut(db: PhoneDatabase = database()): Promise<void> {
  const enrolment = await activeEnrolment(db);
  await db.meta.delete(activeKey);
  await dropReadData(db);
  if (enrolment === null) return;
  await db.keys.delete(enrolment.owner);
  await db.devices.update(enrolment.deviceId, { lease: null });
}

/** Drops everything that was pulled, and only that. */
export async function dropReadData(db: PhoneDatabase): Promise<void> {
  await db.transaction('rw', db.readTables, () => Promise.all(db.readTables.map((table) => table.clear())));
}
