import type { MigrationInterface, QueryRunner } from 'typeorm';
import { protectTable } from '../protect-table';

/** What the review reads at a glance; can be dropped and rebuilt from the log at any time. */
export class CreateVisitProjections1760000103000 implements MigrationInterface {
  name = 'CreateVisitProjections1760000103000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      create table visit_projections (
        company_id uuid not null,
        visit_id uuid not null,
        visit_date date not null,
        site_name text not null,
        town text not null,
        crew_name text,
        technicians text[] not null,
        technician_ids uuid[] not null,
        standing text not null,
        rank integer not null,
        danger integer not null default 0,
        fault integer not null default 0,
        gap integer not null default 0,
        note integer not null default 0,
        findings jsonb not null default '[]',
        rules_version text not null default '',
        actor_ids uuid[] not null default '{}',
        cycles integer not null default 0,
        zones_done integer not null default 0,
        zones_total integer not null default 0,
        held_entries integer not null default 0,
        left_at timestamptz,
        position bigint not null default 0,
        primary key (company_id, visit_id),
        foreign key (company_id, visit_id) references visits (company_id, id)
      )`);
    await queryRunner.query(
      'create index visit_projections_queue on visit_projections (company_id, rank desc, visit_date, visit_id)',
    );
    await protectTable(queryRunner, 'visit_projections');
    await queryRunner.query(`
      create table stale_projections (
        company_id uuid not null,
        visit_id uuid not null,
        attempts integer not null default 0,
        last_fault text,
        since timestamptz not null default now(),
        mark uuid not null default gen_random_uuid(),
        primary key (company_id, visit_id)
      )`);
    await protectTable(queryRunner, 'stale_projections');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('drop table stale_projections');
    await queryRunner.query('drop table visit_projections');
  }
}
