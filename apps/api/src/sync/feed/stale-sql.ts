import { companySetting as company } from '../../database/protect-table';

/** Marks the visits of one parameter (`$1`, an array of distinct ids), always in one order: two who mark cannot block each other. */
export function markStaleSql(parameter: string): string {
  return `insert into stale_projections (company_id, visit_id)
    select ${company}, id from unnest(${parameter}::uuid[]) as id order by id
    on conflict (company_id, visit_id) do update set attempts = 0, mark = gen_random_uuid()`;
}
