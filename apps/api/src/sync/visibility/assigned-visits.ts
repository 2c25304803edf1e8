import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../../database/protect-table';

export interface DayRange {
  /** ISO dates, both included. */
  from: string;
  to: string;
}

/** Visits that a person is assigned to, within these days or at any time. */
export async function assignedVisits(
  manager: EntityManager,
  userId: string,
  range: DayRange | null,
): Promise<string[]> {
  const rows = await manager.query<{ id: string }[]>(
    `select v.id from visit_assignments a
     join visits v on v.company_id = a.company_id and v.id = a.visit_id
     where a.company_id = ${company} and a.user_id = $1 and ($2::date is null or v.date between $2 and $3::date)
     order by v.date, v.sequence, v.id`,
    [userId, range?.from ?? null, range?.to ?? null],
  );
  return rows.map(({ id }) => id);
}
