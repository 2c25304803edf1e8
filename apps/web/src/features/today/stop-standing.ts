import type { Review } from '@rimeward/contracts';
import type { LogEntry } from '@rimeward/field-log';
import { entriesOfVisit, reviewsOfVisit } from '../../phone/queries/entries';
import type { PhoneVisit } from '../../phone/queries/visits';

/** What has happened at a stop, as far as this phone knows. */
export interface StopLog {
  entries: LogEntry[];
  reviews: Review[];
}

export type StopStanding =
  'untouched' | 'started' | 'left' | 'answered' | 'accepted' | 'sent-back' | 'return-visit';

export async function stopLogs(visits: PhoneVisit[]): Promise<Record<string, StopLog>> {
  const all = await Promise.all(
    visits.map(async (visit): Promise<[string, StopLog]> => {
      const [entries, reviews] = await Promise.all([entriesOfVisit(visit.id), reviewsOfVisit(visit.id)]);
      return [visit.id, { entries, reviews }];
    }),
  );
  return Object.fromEntries(all);
}

/** Questions of the newest decision that no entry has answered yet. */
export function openQuestionCount(log: StopLog | null): number {
  const last = log?.reviews.at(-1);
  if (!log || last?.decision !== 'sent-back') return 0;
  const answered = new Set(
    log.entries.flatMap((entry) => (entry.type === 'question-answered' ? [entry.body.questionId] : [])),
  );
  return last.questions.filter((question) => !answered.has(question.id)).length;
}

export function standingOf(log: StopLog | null): StopStanding {
  if (!log) return 'untouched';
  const decision = log.reviews.at(-1)?.decision;
  if (decision === 'sent-back') {
    const last = log.reviews.at(-1);
    return openQuestionCount(log) > 0 || last?.questions.length === 0 ? 'sent-back' : 'answered';
  }
  if (decision) return decision;
  if (log.entries.some((entry) => entry.type === 'left')) return 'left';
  return log.entries.length > 0 ? 'started' : 'untouched';
}
