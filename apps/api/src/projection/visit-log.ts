import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../database/protect-table';

/** What the log says of one visit. */
export interface VisitLog {
  /** Exact texts of the entries that are not held. */
  texts: string[];
  /** Held entries that nobody has settled. */
  held: number;
  /** Newest position, held entries included; 0 when there is none. */
  position: number;
}

export async function logOfVisit(manager: EntityManager, visitId: string): Promise<VisitLog> {
  const rows = await manager.query<{ position: string; bytes: Buffer | null; settled: boolean }[]>(
    `select e.position, case when e.held_reason is null then e.bytes end as bytes,
       exists (select from held_settlements s where s.company_id = ${company} and s.position = e.position) as settled
     from (
       select position, bytes, held_reason from log_entries where company_id = ${company} and visit_id = $1
       union all
       select position, bytes, held_reason from stray_entries where company_id = ${company} and visit_id = $1
     ) e order by e.position`,
    [visitId],
  );
  return {
    texts: rows.flatMap(({ bytes }) => (bytes === null ? [] : [bytes.toString('utf8')])),
    held: rows.filter(({ bytes, settled }) => bytes === null && !settled).length,
    position: Number(rows.at(-1)?.position ?? 0),
  };
}
