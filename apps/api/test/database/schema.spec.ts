import { DataSource } from 'typeorm';
import { dataSourceOptions } from '../../src/database/data-source';
import { rowsOf } from '../support/admin';
import { createTestDatabase, type TestDatabase } from '../support/database';

const ownTables = `
  select c.oid, c.relname, c.relrowsecurity, c.relforcerowsecurity, pg_get_userbyid(c.relowner) as owner,
    exists (select from pg_attribute a where a.attrelid = c.oid and a.attname = 'company_id') as of_company
  from pg_class c join pg_namespace n on n.oid = c.relnamespace
  where n.nspname = 'public' and c.relkind in ('r', 'p', 'v', 'm')`;

interface TableRow {
  relname: string;
  relrowsecurity: boolean;
  relforcerowsecurity: boolean;
  owner: string;
  of_company: boolean;
}

describe('the schema', () => {
  let database: TestDatabase;

  beforeAll(async () => {
    database = await createTestDatabase();
  });

  afterAll(() => database.drop());

  it('is built from zero, taken down to nothing and built again by migrations', async () => {
    const own = await createTestDatabase({ migrated: false });
    const source = await new DataSource(dataSourceOptions(own.migratorUrl)).initialize();
    const up = await source.runMigrations();
    for (const _ of up) await source.undoLastMigration();
    const rows = await rowsOf<TableRow>(own.adminUrl, ownTables);
    expect(rows.map(({ relname }) => relname)).toEqual(['migrations']);
    expect(await source.runMigrations()).toHaveLength(up.length);
    await source.destroy();
    await own.drop();
  });

  it('gives every entity the columns and types that it names', async () => {
    const source = await new DataSource(dataSourceOptions(database.migratorUrl)).initialize();
    const diff = await source.driver.createSchemaBuilder().log();
    await source.destroy();
    expect(diff.upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('forces row level security with a policy for every command on each table of a company', async () => {
    const rows = await rowsOf<TableRow>(database.adminUrl, ownTables);
    const guarded = rows.filter(({ of_company, relname }) => of_company || relname === 'companies');
    expect(guarded.length).toBeGreaterThan(20);
    expect(guarded.filter((table) => !table.relrowsecurity || !table.relforcerowsecurity)).toEqual([]);
    const policies = await rowsOf<{ tablename: string }>(
      database.adminUrl,
      `select tablename from pg_policies where cmd = 'ALL' and qual is not null and with_check is not null
         and qual like '%app.company%' and with_check like '%app.company%'`,
    );
    const covered = new Set(policies.map(({ tablename }) => tablename));
    expect(guarded.filter(({ relname }) => !covered.has(relname))).toEqual([]);
  });

  it('lets look-up policies read only, and only by a value that the holder names', async () => {
    const rows = await rowsOf<{ policyname: string; cmd: string; qual: string }>(
      database.adminUrl,
      `select policyname, cmd, qual from pg_policies where qual not like '%app.company%' order by policyname`,
    );
    expect(rows.map(({ policyname, cmd }) => [policyname, cmd])).toEqual([
      ['devices_look_up', 'SELECT'],
      ['sessions_look_up', 'SELECT'],
      ['users_look_up', 'SELECT'],
    ]);
    for (const { qual } of rows)
      expect(qual).toMatch(/= NULLIF\(current_setting\('app\.\w+'::text, true\), ''::text\)/);
  });

  it('gives the application a role that owns nothing and cannot step around the policies', async () => {
    const rows = await rowsOf<TableRow>(database.adminUrl, ownTables);
    expect(new Set(rows.map(({ owner }) => owner))).toEqual(new Set(['rimeward_migrator']));
    const role = await rowsOf(
      database.adminUrl,
      `select rolsuper, rolbypassrls, rolcreaterole, rolcreatedb from pg_roles where rolname = 'rimeward_app'`,
    );
    expect(role).toEqual([
      { rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false },
    ]);
  });

  it('has no view that runs with its owner’s rights, no materialized view and no function with borrowed rights', async () => {
    const rows = await rowsOf(
      database.adminUrl,
      `
        select relname as name from pg_class c join pg_namespace n on n.oid = c.relnamespace
        where n.nspname = 'public' and (relkind = 'm'
          or (relkind = 'v' and not coalesce(reloptions @> '{security_invoker=true}', false)))
        union all
        select proname from pg_proc p join pg_namespace n on n.oid = p.pronamespace
        where n.nspname = 'public' and prosecdef`,
    );
    expect(rows).toEqual([]);
  });

  it('begins every unique key of a company’s table with the company', async () => {
    const rows = await rowsOf<{ index: string }>(
      database.adminUrl,
      `
        select i.indexrelid::regclass::text as index from pg_index i
          join pg_attribute company on company.attrelid = i.indrelid and company.attname = 'company_id'
        where i.indisunique and i.indkey[0] <> company.attnum`,
    );
    expect(rows).toEqual([]);
  });

  it('keeps the log from being changed or removed by the application', async () => {
    const rows = await rowsOf<{ table_name: string; privilege_type: string }>(
      database.adminUrl,
      `
        select table_name, privilege_type from information_schema.role_table_grants
        where grantee = 'rimeward_app' and privilege_type not in ('SELECT', 'INSERT', 'UPDATE', 'DELETE')
          or (grantee = 'rimeward_app' and privilege_type in ('UPDATE', 'DELETE')
            and table_name in ('log_entries', 'stray_entries', 'held_settlements', 'visit_reviews'))`,
    );
    expect(rows).toEqual([]);
  });
});
