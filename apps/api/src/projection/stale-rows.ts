import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../database/protect-table';

/** After so many failures a visit waits for its next change, or for a rebuild. */
const mostAttempts = 5;

/** Visits whose at-a-glance copy is older than their log, and visits that never had one. */
export async function staleVisits(manager: EntityManager, limit: number): Promise<string[]> {
  const rows = await manager.query<{ visit_id: string }[]>(
    `select visit_id from stale_projections where company_id = ${company} and attempts < $1
     order by attempts, since, visit_id limit $2`,
    [mostAttempts, limit],
  );
  return rows.map((row) => row.visit_id);
}

/** Marks every visit that has no copy yet, and those under way on which a night has passed: what is missing counts from then on. */
export async function markUnprojected(manager: EntityManager): Promise<void> {
  await manager.query(
    `insert into stale_projections (company_id, visit_id)
     select v.company_id, v.id from visits v
     left join visit_projections p on p.company_id = v.company_id and p.visit_id = v.id
     where v.company_id = ${company}
       and (p.visit_id is null or (p.standing = 'under-way' and not p.at_the_end
         and v.date < ((now() - interval '12 hours') at time zone 'UTC')::date))
     order by v.id
     on conflict (company_id, visit_id) do nothing`,
  );
}

/** The mark as it is before the log is read; a later change puts another one. */
export async function readMark(manager: EntityManager, visitId: string): Promise<string | null> {
  const rows = await manager.query<{ mark: string }[]>(
    `select mark from stale_projections where company_id = ${company} and visit_id = $1`,
    [visitId],
  );
  return rows[0]?.mark ?? null;
}

export async function clearMark(manager: EntityManager, visitId: string, mark: string): Promise<void> {
  await manager.query(
    `delete from stale_projections where company_id = ${company} and visit_id = $1 and mark = $2`,
    [visitId, mark],
  );
}

export async function noteFailure(manager: EntityManager, visitId: string, fault: string): Promise<void> {
  await manager.query(
    `update stale_projections set attempts = attempts + 1, last_fault = left($2, 500)
     where company_id = ${company} and visit_id = $1`,
    [visitId, fault],
  );
}
