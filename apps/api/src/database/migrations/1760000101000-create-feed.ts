import type { MigrationInterface, QueryRunner } from 'typeorm';
import { protectTable } from '../protect-table';

/**
 * What changed, by name, in commit order. Entries of the log take their positions from the same counter and need no
 * row here. The epoch names this database's line of positions; a restored copy gets another.
 */
export class CreateFeed1760000101000 implements MigrationInterface {
  name = 'CreateFeed1760000101000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      create table feed (
        company_id uuid not null,
        position bigint not null,
        kind text not null check (kind in ('company', 'visit', 'visit-removed', 'review')),
        ref_id uuid,
        visit_id uuid,
        user_id uuid,
        at timestamptz not null,
        primary key (company_id, position)
      )`);
    await queryRunner.query('create index feed_by_visit on feed (company_id, visit_id, position)');
    await protectTable(queryRunner, 'feed', { appendOnly: true });
    await queryRunner.query(`
      create table feed_epoch (
        singleton boolean primary key default true check (singleton),
        epoch uuid not null default gen_random_uuid()
      )`);
    await queryRunner.query('insert into feed_epoch default values');
    await queryRunner.query('grant select on feed_epoch to rimeward_app');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('drop table feed_epoch');
    await queryRunner.query('drop table feed');
  }
}
