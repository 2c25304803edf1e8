import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../../database/protect-table';
import { markStaleSql } from './stale-sql';

/** A change that readers of the feed have to hear of. */
export type FeedChange =
  | { kind: 'company' }
  | { kind: 'visit'; id: string }
  /** A person may no longer see this visit. */
  | { kind: 'visit-removed'; id: string; userId: string }
  | { kind: 'review'; id: string; visitId: string };

const touchSql = `
  with changes as (
    select * from jsonb_to_recordset($1::jsonb) as c (kind text, ref_id uuid, visit_id uuid, user_id uuid, n int)
  ), taken as (
    insert into company_positions (company_id, position)
    select ${company}, $2::bigint
    on conflict (company_id) do update set position = company_positions.position + excluded.position
    returning company_id, position - $2::bigint as base
  )
  insert into feed (company_id, position, kind, ref_id, visit_id, user_id, at)
  select company_id, base + n, kind, ref_id, visit_id, user_id, clock_timestamp() from taken, changes
  returning position`;

/** Writes the company's feed. Readers see positions in commit order, without gaps. */
@Injectable()
export class FeedService {
  /**
   * Tells readers of the feed about changes made in this transaction. Call it last: the company's counter stays locked from
   * here to the commit, and whoever takes other locks after it can deadlock.
   *
   * @returns position of the last change
   */
  async touch(manager: EntityManager, ...changes: FeedChange[]): Promise<number> {
    if (changes.length === 0) throw new Error('no change to tell');
    const visits = changes.flatMap((change) => (change.kind === 'visit' ? [change.id] : []));
    if (visits.length > 0) await markStale(manager, visits);
    const rows = await manager.query<{ position: string }[]>(touchSql, [
      JSON.stringify(changes.map(feedRow)),
      changes.length,
    ]);
    if (rows.length !== changes.length) throw new Error('feed rows were not written');
    return Math.max(...rows.map((row) => Number(row.position)));
  }
}

/** Notes that the at-a-glance copy of these visits is older than what this transaction writes. */
export async function markStale(manager: EntityManager, visitIds: readonly string[]): Promise<void> {
  await manager.query(markStaleSql('$1'), [[...new Set(visitIds)]]);
}

function feedRow(change: FeedChange, index: number): object {
  const n = index + 1;
  switch (change.kind) {
    case 'company':
      return { n, kind: change.kind };
    case 'visit':
      return { n, kind: change.kind, ref_id: change.id, visit_id: change.id };
    case 'visit-removed':
      return { n, kind: change.kind, ref_id: change.id, visit_id: change.id, user_id: change.userId };
    case 'review':
      return { n, kind: change.kind, ref_id: change.id, visit_id: change.visitId };
  }
}
