import { randomBytes } from 'node:crypto';
import { Client } from 'pg';
import { DataSource } from 'typeorm';
import { dataSourceOptions } from '../../src/database/data-source';

export interface TestDatabase {
  /** Role of the application: owns nothing, sees one company at a time. */
  appUrl: string;
  /** Owner of the schema. */
  migratorUrl: string;
  /** Superuser: sees past row level security, to check what is really stored. */
  adminUrl: string;
  drop: () => Promise<void>;
}

const passwords = { app: 'app-in-tests', migrator: 'migrator-in-tests' } as const;

function adminUrl(): string {
  const url = process.env['TEST_POSTGRES_ADMIN_URL'];
  if (!url) throw new Error('TEST_POSTGRES_ADMIN_URL is not set');
  return url;
}

function urlOf(database: string, role: 'app' | 'migrator' | null): string {
  const url = new URL(adminUrl());
  url.pathname = `/${database}`;
  if (role) {
    url.username = `rimeward_${role}`;
    url.password = passwords[role];
  }
  return url.href;
}

async function asAdmin(statements: string[]): Promise<void> {
  const client = new Client({ connectionString: adminUrl() });
  await client.connect();
  try {
    for (const statement of statements) await client.query(statement);
  } finally {
    await client.end();
  }
}

function template(): string {
  const name = process.env['TEST_TEMPLATE_DATABASE'];
  if (!name) throw new Error('TEST_TEMPLATE_DATABASE is not set');
  return name;
}

/** Roles, and one database brought to the newest migration. */
export async function makeTemplate(): Promise<void> {
  const roles = (['app', 'migrator'] as const).map(
    (role) => `do $$ begin
      if not exists (select from pg_roles where rolname = 'rimeward_${role}') then
        create role rimeward_${role} login nosuperuser nobypassrls;
      end if;
      alter role rimeward_${role} password '${passwords[role]}';
    end $$`,
  );
  await asAdmin([...roles, `create database ${template()} owner rimeward_migrator`]);
  const dataSource = await new DataSource(dataSourceOptions(urlOf(template(), 'migrator'))).initialize();
  await dataSource.runMigrations();
  await dataSource.destroy();
}

/** A fresh copy of the migrated database; an empty one when `migrated` is false. */
export async function createTestDatabase({ migrated = true } = {}): Promise<TestDatabase> {
  const name = `test_${randomBytes(6).toString('hex')}`;
  await asAdmin([
    `create database ${name} owner rimeward_migrator ${migrated ? `template ${template()}` : ''}`,
  ]);
  return {
    appUrl: urlOf(name, 'app'),
    migratorUrl: urlOf(name, 'migrator'),
    adminUrl: urlOf(name, null),
    drop: () => asAdmin([`drop database ${name} with (force)`]),
  };
}
