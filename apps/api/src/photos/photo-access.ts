import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../database/protect-table';

/** Whether one of these visits, or an entry that this person wrote, names the photograph. */
export async function isNamedFor(
  manager: EntityManager,
  sha256: string,
  userId: string,
  visits: readonly string[],
): Promise<boolean> {
  const rows = await manager.query<unknown[]>(
    `select 1 from photo_references r
     where r.company_id = ${company} and r.sha256 = $1
       and (r.visit_id = any($2::uuid[]) or exists (
         select from log_entries e where e.company_id = r.company_id and e.position = r.position and e.actor_id = $3))
     limit 1`,
    [sha256, visits, userId],
  );
  return rows.length > 0;
}
