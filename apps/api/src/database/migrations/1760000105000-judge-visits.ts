import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What the rules need of a visit at a glance. The copies are made anew from the log. */
export class JudgeVisits1760000105000 implements MigrationInterface {
  name = 'JudgeVisits1760000105000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('truncate visit_projections');
    await queryRunner.query('alter table visit_projections add column arrived_at timestamptz');
    await queryRunner.query('alter table visit_projections add column at_the_end boolean not null');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('alter table visit_projections drop column at_the_end');
    await queryRunner.query('alter table visit_projections drop column arrived_at');
  }
}
