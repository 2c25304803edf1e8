import type { EntryType } from '@rimeward/field-log';
import { database } from '../database/database';
import type { EntryRow, PhotoRow } from '../database/schema';
import { chainMarks } from '../delivery/chain-marks';
import { readProgress } from '../delivery/progress';
import type { Standing } from '../delivery/status';
import { activeEnrolment } from '../device/enrolment';
import { photoStanding } from './photos';

/** One thing that has not come to rest: unsent, on its way, or held by the office. */
export type OutboxItem =
  | {
      kind: 'entry';
      id: string;
      visit: string;
      type: EntryType;
      savedMs: number;
      bytes: number;
      standing: Standing;
      why: string | null;
    }
  | {
      kind: 'photo';
      id: string;
      visit: string | null;
      type: string;
      savedMs: number;
      bytes: number;
      standing: Standing;
      why: string | null;
    };

/** The active person's items, unsent ones first and oldest first; held ones after them. Reads unsent and held rows only. */
export async function outboxItems(limit = 500): Promise<OutboxItem[]> {
  const enrolment = await activeEnrolment();
  if (enrolment === null) return [];
  const db = database();
  const device = enrolment.deviceId;
  const { acknowledged } = await chainMarks(db, device);
  const [unsent, held, photos, progress] = await Promise.all([
    db.entries
      .where('[device+seq]')
      .between([device, acknowledged.seq], [device, Infinity], false)
      .limit(limit)
      .toArray(),
    db.entries.where('[device+heldReason]').between([device, ''], [device, '\uffff']).limit(limit).toArray(),
    db.photos
      .where('[device+state]')
      .anyOf([device, 'pending'], [device, 'refused'], [device, 'damaged'])
      .limit(limit)
      .toArray(),
    readProgress(),
  ]);
  const sending = progress?.device === device && progress.phase === 'sending' && progress.reason === null;
  const waiting: Standing = sending ? 'on-its-way' : 'on-this-phone';
  return [
    ...unsent.map((row) => entryItem(row, waiting)),
    ...photos.map((row) => photoItem(row, waiting)),
    ...held.map((row) => entryItem(row, 'held')),
  ];
}

function entryItem(row: EntryRow, standing: Standing): OutboxItem {
  const { id, visit, savedMs, byteLength, heldReason } = row;
  return {
    kind: 'entry',
    id,
    visit,
    type: row.entry.type,
    savedMs,
    bytes: byteLength,
    standing,
    why: heldReason ?? null,
  };
}

function photoItem(row: PhotoRow, waiting: Standing): OutboxItem {
  const standing = row.state === 'pending' ? waiting : photoStanding(row);
  return {
    kind: 'photo',
    id: row.sha256,
    visit: row.visit,
    type: row.type,
    savedMs: row.storedMs,
    bytes: row.bytes,
    standing,
    why: row.why ?? (row.state === 'damaged' ? 'damaged' : null),
  };
}
