import { database, type PhoneDatabase } from '../database/database';
import { chainMarks } from '../delivery/chain-marks';
import { forgetHead } from '../save/known-head';
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
  const [{ head, acknowledged }, photos, held] = await Promise.all([
    chainMarks(db, device),
    db.photos.where({ device, state: 'pending' }).toArray(),
    db.entries.where('[device+heldReason]').between([device, ''], [device, '\uffff']).count(),
  ]);
  return {
    entries: head.seq - acknowledged.seq,
    photos: photos.length,
    bytes:
      head.bytesThrough - acknowledged.bytesThrough + photos.reduce((sum, photo) => sum + photo.bytes, 0),
    held,
  };
}

/**
 * Signs this phone out: what was read and the keys to it go, with or without the office; entries, photographs and drafts
 * stay, locked for their person, and are sent when that person signs in again.
 */
export async function lockOnSignOut(db: PhoneDatabase = database()): Promise<void> {
  const enrolment = await activeEnrolment(db);
  forgetHead();
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
