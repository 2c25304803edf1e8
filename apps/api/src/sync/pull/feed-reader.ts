import type { EntityManager } from 'typeorm';
import { logColumns, storedEntry, type LogRow } from '../log/log-reader';
import type { StoredEntry } from '@rimeward/contracts';
import { companySetting as company } from '../../database/protect-table';

/** Where the company's feed stands. */
export interface FeedHead {
  /** Names this database's line of positions: another one means that the office was restored. */
  epoch: string;
  position: number;
}

/**
 * The stored epoch together with what makes this database this one: a dump restored elsewhere, or a cluster restored to a
 * point in time, goes by another name even when nobody has renewed the stored part.
 */
const headSql = `
  select md5(e.epoch::text || d.oid || c.system_identifier || t.timeline_id) as epoch,
    coalesce((select position from company_positions where company_id = ${company}), 0)::text as position
  from feed_epoch e, pg_database d, pg_control_system() c, pg_control_checkpoint() t
  where d.datname = current_database()`;

/** Read this first: what is read after it is at least as new as this position. */
export async function readHead(manager: EntityManager): Promise<FeedHead> {
  const [row] = await manager.query<{ epoch: string; position: string }[]>(headSql);
  if (row === undefined) throw new Error('the feed has no epoch');
  return { epoch: row.epoch, position: Number(row.position) };
}

/** What one reader may see, and from where to where he reads. */
export interface ReaderScope {
  userId: string;
  visits: readonly string[];
  /** Own entries elsewhere are told for this long back. */
  ownSince: Date;
  after: number;
  through: number;
  limit: number;
}

export type FeedRow =
  | { position: number; kind: 'company' }
  | { position: number; kind: 'visit' | 'visit-removed' | 'review'; id: string }
  | { position: number; kind: 'entry'; entry: StoredEntry };

const rowsSql = `
  select position, kind, ref_id, null::uuid as device_id, null::integer as seq, visit_id, null::bytea as bytes, null::bytea as hash,
    at as received_at, null::text as held_reason
  from feed
  where company_id = ${company} and position > $1 and position <= $2
    and (kind = 'company' or (kind in ('visit', 'review') and visit_id = any($3::uuid[]))
      or (kind = 'visit-removed' and user_id = $4))
  union all
  select position, 'entry', null, device_id, seq, visit_id, bytes, hash, received_at, held_reason
  from log_entries
  where company_id = ${company} and position > $1 and position <= $2
    and (visit_id = any($3::uuid[]) or (actor_id = $4 and received_at > $5))
  order by position limit $6`;

type Row = LogRow & { kind: FeedRow['kind']; ref_id: string | null };

/** Rows of the feed that the reader may see, ascending. */
export async function readFeed(manager: EntityManager, scope: ReaderScope): Promise<FeedRow[]> {
  const { after, through, visits, userId, ownSince, limit } = scope;
  const rows = await manager.query<Row[]>(rowsSql, [after, through, visits, userId, ownSince, limit]);
  return rows.map(toFeedRow);
}

/** Entries of visits up to a position: for a reader to whom the visit is new, or has changed hands. */
export async function earlierEntries(
  manager: EntityManager,
  visits: readonly string[],
  through: number,
): Promise<StoredEntry[]> {
  const rows = await manager.query<LogRow[]>(
    `select ${logColumns} from log_entries
     where company_id = ${company} and visit_id = any($1::uuid[]) and position <= $2 order by position`,
    [visits, through],
  );
  return rows.map(storedEntry);
}

function toFeedRow(row: Row): FeedRow {
  const position = Number(row.position);
  if (row.kind === 'entry') return { position, kind: row.kind, entry: storedEntry(row) };
  if (row.kind === 'company') return { position, kind: row.kind };
  if (row.ref_id === null) throw new Error(`feed row ${position} names nothing`);
  return { position, kind: row.kind, id: row.ref_id };
}
