import type { MigrationInterface, QueryRunner } from 'typeorm';
import { allowLookUp, protectTable } from '../protect-table';

/** Companies, people, their sessions and their devices. Every key begins with the company. */
export class CreateCompaniesAndPeople1760000000000 implements MigrationInterface {
  name = 'CreateCompaniesAndPeople1760000000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      create table companies (
        id uuid not null primary key,
        name text not null,
        settings jsonb not null,
        created_at timestamptz not null default now()
      )`);
    await queryRunner.query(`
      create table crews (
        company_id uuid not null references companies (id),
        id uuid not null,
        name text not null,
        primary key (company_id, id)
      )`);
    await queryRunner.query(`
      create table users (
        company_id uuid not null references companies (id),
        id uuid not null,
        email text not null,
        name text not null,
        role text not null,
        language text not null,
        password_hash text not null,
        blow_out_signed_off boolean not null default false,
        crew_id uuid,
        disabled_at timestamptz,
        primary key (company_id, id),
        foreign key (company_id, crew_id) references crews (company_id, id)
      )`);
    await queryRunner.query('create unique index users_by_email on users (company_id, email)');
    await queryRunner.query('create index users_email on users (email)');
    await queryRunner.query(`
      create table sessions (
        company_id uuid not null,
        id uuid not null,
        user_id uuid not null,
        generation integer not null,
        generation_used boolean not null,
        rotated_at timestamptz not null,
        created_at timestamptz not null,
        last_used_at timestamptz not null,
        idle_until timestamptz not null,
        expires_at timestamptz not null,
        ended_at timestamptz,
        ended_because text,
        primary key (company_id, id),
        foreign key (company_id, user_id) references users (company_id, id)
      )`);
    await queryRunner.query('create index sessions_id on sessions (id)');
    await queryRunner.query(`
      create table devices (
        company_id uuid not null,
        id uuid not null,
        user_id uuid not null,
        name text not null,
        platform text not null,
        secret_hash bytea not null,
        enrolled_at timestamptz not null,
        revoked_at timestamptz,
        primary key (company_id, id),
        foreign key (company_id, user_id) references users (company_id, id)
      )`);
    await queryRunner.query('create index devices_id on devices (id)');
    await protectTable(queryRunner, 'companies', { column: 'id' });
    for (const table of ['crews', 'users', 'sessions', 'devices']) await protectTable(queryRunner, table);
    await allowLookUp(queryRunner, 'users', 'sign_in_email', 'email');
    await allowLookUp(queryRunner, 'sessions', 'session', 'id::text');
    await allowLookUp(queryRunner, 'devices', 'device', 'id::text');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of ['devices', 'sessions', 'users', 'crews', 'companies']) {
      await queryRunner.query(`drop table ${table}`);
    }
  }
}
