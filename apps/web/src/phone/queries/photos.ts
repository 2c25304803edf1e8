import type { PhotoReference } from '@rimeward/field-log';
import { database } from '../database/database';
import type { PhotoRow } from '../database/schema';
import type { Standing } from '../delivery/status';
import { activeEnrolment } from '../device/enrolment';
import { entriesOfVisit } from './entries';

export interface PhoneVisitPhoto {
  photo: PhotoReference;
  entryId: string;
  standing: Standing;
  /** False when only the office, or another phone, has it. */
  onThisPhone: boolean;
}

/** Photographs that the visit's entries name, with where each one is. */
export async function photosOfVisit(id: string): Promise<PhoneVisitPhoto[]> {
  const [entries, enrolment] = await Promise.all([entriesOfVisit(id), activeEnrolment()]);
  const named = entries.flatMap((entry) => entry.photos.map((photo) => ({ photo, entryId: entry.id })));
  const device = enrolment?.deviceId ?? '';
  const rows = await database().photos.bulkGet(
    named.map(({ photo }): [string, string] => [device, photo.sha256]),
  );
  return named.map((one, index) => ({
    ...one,
    standing: photoStanding(rows[index]),
    onThisPhone: rows[index] !== undefined,
  }));
}

export function photoStanding(row: PhotoRow | undefined): Standing {
  if (row === undefined || row.state === 'complete') return 'with-the-office';
  return row.state === 'refused' || row.state === 'damaged' ? 'held' : 'on-this-phone';
}
