import type { QueryRunner } from 'typeorm';

interface Protection {
  /** The application may add and read rows, never change or remove them. */
  appendOnly?: boolean;
  /** Column that holds the company; `id` on the table of companies itself. */
  column?: string;
}

export const companySetting = "nullif(current_setting('app.company', true), '')::uuid";

/** Row level security for one table: forced, one policy for every command, rights for the application's role. */
export async function protectTable(
  queryRunner: QueryRunner,
  table: string,
  { appendOnly = false, column = 'company_id' }: Protection = {},
): Promise<void> {
  await queryRunner.query(`alter table ${table} enable row level security`);
  await queryRunner.query(`alter table ${table} force row level security`);
  await queryRunner.query(
    `create policy ${table}_company on ${table} using (${column} = ${companySetting}) with check (${column} = ${companySetting})`,
  );
  const rights = appendOnly ? 'select, insert' : 'select, insert, update, delete';
  await queryRunner.query(`grant ${rights} on ${table} to rimeward_app`);
}

/**
 * Lets one row be read before its company is known, by a value that only its holder can name: an e-mail at sign-in, the
 * id inside a session's or a device's credential.
 */
export async function allowLookUp(
  queryRunner: QueryRunner,
  table: string,
  setting: string,
  match: string,
): Promise<void> {
  await queryRunner.query(
    `create policy ${table}_look_up on ${table} for select using (${match} = nullif(current_setting('app.${setting}', true), ''))`,
  );
}
