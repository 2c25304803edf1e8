import type { Review } from '@rimeward/contracts';
import { database } from '../database/database';
import { entriesOfVisit, reviewsOfVisit } from './entries';

export interface OpenQuestion {
  visitId: string;
  question: Review['questions'][number];
  review: Review;
}

/** Questions of visits whose last decision is "sent back" and that no entry here answers yet. */
export async function openQuestions(): Promise<OpenQuestion[]> {
  const sentBack = await database().read_reviews.where({ decision: 'sent-back' }).toArray();
  const visits = [...new Set(sentBack.map(({ visit }) => visit))];
  return (await Promise.all(visits.map(openOfVisit))).flat();
}

async function openOfVisit(visitId: string): Promise<OpenQuestion[]> {
  const last = (await reviewsOfVisit(visitId)).at(-1);
  if (last?.decision !== 'sent-back') return [];
  const entries = await entriesOfVisit(visitId);
  const answered = new Set(
    entries.flatMap((entry) => (entry.type === 'question-answered' ? [entry.body.questionId] : [])),
  );
  return last.questions
    .filter(({ id }) => !answered.has(id))
    .map((question) => ({ visitId, question, review: last }));
}
