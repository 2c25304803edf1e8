import type { StoredEntry } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../../database/protect-table';

export interface LogRow {
  position: string;
  device_id: string;
  seq: number;
  visit_id: string | null;
  bytes: Buffer;
  hash: Buffer;
  received_at: Date;
  held_reason: string | null;
}

/** Columns that a `LogRow` needs, of the log and of the stray entries alike. */
export const logColumns = 'position, device_id, seq, visit_id, bytes, hash, received_at, held_reason';

/** The exact text again: valid UTF-8 in, the same bytes out. */
export function storedEntry(row: LogRow): StoredEntry {
  return {
    position: Number(row.position),
    device: row.device_id,
    seq: row.seq,
    visitId: row.visit_id,
    text: row.bytes.toString('utf8'),
    hash: row.hash.toString('hex'),
    receivedAt: row.received_at.toISOString(),
    heldReason: row.held_reason,
  };
}

/** Everything that arrived for a visit, held entries and those beside the chain included, in order of arrival. */
export async function entriesOfVisit(manager: EntityManager, visitId: string): Promise<StoredEntry[]> {
  const rows = await manager.query<LogRow[]>(
    `select ${logColumns} from log_entries where company_id = ${company} and visit_id = $1
     union all
     select ${logColumns} from stray_entries where company_id = ${company} and visit_id = $1
     order by position`,
    [visitId],
  );
  return rows.map(storedEntry);
}
