import type { Review } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../database/protect-table';

interface ReviewRow {
  id: string;
  visit_id: string;
  number: number;
  decision: Review['decision'];
  remark: string | null;
  questions: Review['questions'];
  by_user_id: string;
  by_name: string;
  at: Date;
  seen_position: string;
}

const columns = 'id, visit_id, number, decision, remark, questions, by_user_id, by_name, at, seen_position';

/** Decisions on these visits, each visit's in order. */
export async function reviewsOf(manager: EntityManager, visitIds: readonly string[]): Promise<Review[]> {
  const rows = await manager.query<ReviewRow[]>(
    `select ${columns} from visit_reviews where company_id = ${company} and visit_id = any($1::uuid[])
     order by visit_id, number`,
    [visitIds],
  );
  return rows.map(toReview);
}

export async function reviewsById(manager: EntityManager, ids: readonly string[]): Promise<Review[]> {
  const rows = await manager.query<ReviewRow[]>(
    `select ${columns} from visit_reviews where company_id = ${company} and id = any($1::uuid[])`,
    [ids],
  );
  return rows.map(toReview);
}

export async function appendReview(manager: EntityManager, review: Review): Promise<void> {
  const rows = await manager.query<{ id: string }[]>(
    `insert into visit_reviews (company_id, ${columns})
     values (${company}, $1, $2, $3, $4, $5, $6, $7, $8, $9, $10) returning id`,
    [
      review.id,
      review.visitId,
      review.number,
      review.decision,
      review.remark,
      JSON.stringify(review.questions),
      review.by.id,
      review.by.name,
      review.at,
      review.seenPosition,
    ],
  );
  if (rows.length !== 1) throw new Error('a decision was not written');
}

/** Until the transaction ends, nobody else decides on this visit or projects it. */
export async function lockVisit(manager: EntityManager, visitId: string): Promise<void> {
  await manager.query("select pg_advisory_xact_lock(hashtextextended('visit ' || $1::text, 0))", [visitId]);
}

function toReview(row: ReviewRow): Review {
  return {
    id: row.id,
    visitId: row.visit_id,
    number: row.number,
    decision: row.decision,
    remark: row.remark,
    questions: row.questions,
    by: { id: row.by_user_id, name: row.by_name },
    at: row.at.toISOString(),
    seenPosition: Number(row.seen_position),
  };
}
