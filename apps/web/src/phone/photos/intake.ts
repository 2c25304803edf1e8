import type { PhotoType } from '@rimeward/contracts';
import { toHex } from '@rimeward/delivery';
import type { GeoPoint, PhotoReference, PhotoRole } from '@rimeward/field-log';
import { database, type PhoneDatabase } from '../database/database';
import { databaseFault, type DatabaseFault } from '../database/faults';
import type { Enrolment, PhotoRow } from '../database/schema';
import { activeEnrolment } from '../device/enrolment';
import { storeChunks } from './chunks';
import { photoLimits } from './limits';
import { queuePreview } from './preview';
import { sniffedBytes, sniffPhotoType } from './sniff';

export interface AboutPhoto {
  role: PhotoRole;
  /** Position at the moment of capture, see `positionNow`. */
  takenAt: GeoPoint | null;
  source: 'camera' | 'gallery';
}

export type PhotoFault = 'empty' | 'wrong-type' | 'too-large' | 'unreadable' | 'not-enrolled' | DatabaseFault;

export type PhotoResult = { ok: true; photo: PhotoReference } | { ok: false; fault: PhotoFault };

/**
 * Stores a picture, byte for byte, in chunks that have been read back. Its identity is the SHA-256 of those bytes: the
 * same picture twice is one photograph. A quota error stops here and leaves the room kept for text alone.
 */
export async function storePhoto(file: Blob, about: AboutPhoto): Promise<PhotoResult> {
  if (file.size === 0) return { ok: false, fault: 'empty' };
  if (file.size > photoLimits.originalBytes) return { ok: false, fault: 'too-large' };
  const bytes = await readWhole(file);
  if (bytes === null) return { ok: false, fault: 'unreadable' };
  const type = sniffPhotoType(new Uint8Array(bytes, 0, Math.min(sniffedBytes, bytes.byteLength)));
  if (type === null) return { ok: false, fault: 'wrong-type' };
  try {
    return await store(database(), bytes, type, about);
  } catch (error) {
    const fault = databaseFault(error);
    if (fault === null) throw error;
    return { ok: false, fault };
  }
}

async function store(
  db: PhoneDatabase,
  bytes: ArrayBuffer,
  type: PhotoType,
  about: AboutPhoto,
): Promise<PhotoResult> {
  const enrolment = await activeEnrolment(db);
  if (enrolment === null) return { ok: false, fault: 'not-enrolled' };
  const sha256 = toHex(new Uint8Array(await crypto.subtle.digest('SHA-256', bytes)));
  const reference: PhotoReference = { sha256, bytes: bytes.byteLength, type, ...about };
  const known = await db.photos.get([enrolment.deviceId, sha256]);
  if (known === undefined || known.state === 'storing' || known.state === 'damaged') {
    const row = known ?? newRow(enrolment, sha256, bytes.byteLength, type);
    // The row comes first: tidying takes chunks for rubbish only when no row names them.
    await db.photos.put(known?.state === 'damaged' ? known : row);
    if (!(await storeChunks(db, sha256, bytes))) return { ok: false, fault: 'database-broken' };
    await db.photos.put({ ...row, state: row.visit === null ? 'loose' : 'pending', why: null });
  }
  queuePreview(sha256, bytes, type);
  return { ok: true, photo: reference };
}

function newRow(enrolment: Enrolment, sha256: string, bytes: number, type: PhotoType): PhotoRow {
  return {
    device: enrolment.deviceId,
    sha256,
    owner: enrolment.owner,
    bytes,
    type,
    state: 'storing',
    why: null,
    visit: null,
    storedMs: Date.now(),
    settledMs: null,
  };
}

/** Null when the browser cannot hand the file over: moved, cloud copy not loaded, permission withdrawn. */
async function readWhole(file: Blob): Promise<ArrayBuffer | null> {
  try {
    const bytes = await file.arrayBuffer();
    return bytes.byteLength === file.size ? bytes : null;
  } catch (error) {
    if (error instanceof DOMException) return null;
    throw error;
  }
}
