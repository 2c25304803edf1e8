import type { DataSource } from 'typeorm';

/**
 * Takes away every at-a-glance copy; each company's are made anew from its log when they are next asked for. Needs the owner
 * of the tables: row level security would hide most of them from the application's role.
 */
export async function dropProjections(dataSource: DataSource): Promise<string> {
  await dataSource.query('truncate visit_projections, stale_projections');
  return 'The copies of all visits are gone; they are made anew from the log as they are asked for.';
}
