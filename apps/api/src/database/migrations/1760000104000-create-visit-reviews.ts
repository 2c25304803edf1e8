import type { MigrationInterface, QueryRunner } from 'typeorm';
import { protectTable } from '../protect-table';

/** Decisions of the review: appended, numbered from 1 within a visit, never changed. */
export class CreateVisitReviews1760000104000 implements MigrationInterface {
  name = 'CreateVisitReviews1760000104000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      create table visit_reviews (
        company_id uuid not null,
        id uuid not null,
        visit_id uuid not null,
        number integer not null check (number > 0),
        decision text not null check (decision in ('accepted', 'sent-back', 'return-visit')),
        remark text,
        questions jsonb not null,
        by_user_id uuid not null,
        by_name text not null,
        at timestamptz not null,
        seen_position bigint not null,
        primary key (company_id, id),
        unique (company_id, visit_id, number),
        foreign key (company_id, visit_id) references visits (company_id, id),
        foreign key (company_id, by_user_id) references users (company_id, id)
      )`);
    await protectTable(queryRunner, 'visit_reviews', { appendOnly: true });
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('drop table visit_reviews');
  }
}
