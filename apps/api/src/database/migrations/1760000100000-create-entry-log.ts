import type { MigrationInterface, QueryRunner } from 'typeorm';
import { protectTable } from '../protect-table';

/**
 * The log as the office keeps it. Exact bytes rule; the other columns are copies for queries, null where the bytes
 * could not be read. No foreign keys on the rows of the log: an entry that names an unknown visit is kept all the same.
 */
export class CreateEntryLog1760000100000 implements MigrationInterface {
  name = 'CreateEntryLog1760000100000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      create table company_positions (
        company_id uuid primary key references companies (id),
        position bigint not null check (position >= 0)
      )`);
    await queryRunner.query(`
      create table device_chains (
        company_id uuid not null,
        device_id uuid not null,
        seq integer not null check (seq >= 0),
        hash bytea not null check (length(hash) = 32),
        manifest jsonb,
        last_contact_at timestamptz not null,
        primary key (company_id, device_id),
        foreign key (company_id, device_id) references devices (company_id, id)
      )`);
    await queryRunner.query(`
      create table log_entries (
        company_id uuid not null,
        position bigint not null,
        device_id uuid not null,
        seq integer not null check (seq > 0),
        prev bytea not null check (length(prev) = 32),
        hash bytea not null check (length(hash) = 32),
        bytes bytea not null,
        entry jsonb,
        entry_id uuid,
        visit_id uuid,
        actor_id uuid,
        type text,
        held_reason text,
        received_at timestamptz not null,
        primary key (company_id, position)
      )`);
    await queryRunner.query(
      'create unique index log_entries_by_device on log_entries (company_id, device_id, seq)',
    );
    await queryRunner.query(
      'create index log_entries_by_visit on log_entries (company_id, visit_id, position)',
    );
    await queryRunner.query(
      'create index log_entries_held on log_entries (company_id, position) where held_reason is not null',
    );
    await queryRunner.query(`
      create table stray_entries (
        company_id uuid not null,
        position bigint not null,
        device_id uuid not null,
        seq integer not null check (seq >= 0),
        hash bytea not null check (length(hash) = 32),
        bytes bytea not null,
        visit_id uuid,
        held_reason text not null,
        received_at timestamptz not null,
        primary key (company_id, position),
        unique (company_id, device_id, seq, hash)
      )`);
    await queryRunner.query(`
      create table held_settlements (
        company_id uuid not null,
        position bigint not null,
        note text not null,
        by_user_id uuid not null,
        by_name text not null,
        at timestamptz not null,
        primary key (company_id, position),
        foreign key (company_id, by_user_id) references users (company_id, id)
      )`);
    await protectTable(queryRunner, 'company_positions');
    await protectTable(queryRunner, 'device_chains');
    await protectTable(queryRunner, 'log_entries', { appendOnly: true });
    await protectTable(queryRunner, 'stray_entries', { appendOnly: true });
    await protectTable(queryRunner, 'held_settlements', { appendOnly: true });
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of [
      'held_settlements',
      'stray_entries',
      'log_entries',
      'device_chains',
      'company_positions',
    ])
      await queryRunner.query(`drop table ${table}`);
  }
}
