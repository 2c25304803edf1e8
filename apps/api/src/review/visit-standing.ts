import type { DecideRequest, VisitStanding } from '@rimeward/contracts';

type Decision = DecideRequest['decision'];

/** What the standing of a visit follows from; nothing else is stored about it. */
export interface StandingFacts {
  /** Entries of the visit that are not held. */
  entries: number;
  left: boolean;
  /** Newest position of the visit's log. */
  position: number;
  lastDecision: { decision: Decision; seenPosition: number; questionIds: readonly string[] } | null;
  answeredQuestionIds: ReadonlySet<string>;
}

/**
 * Where a visit stands for the review. What arrives after a decision opens an accepted visit again: nobody has seen it. A
 * visit that was sent back waits for the answer to each question, or, sent back without one, for any new entry.
 */
export function standingOf(facts: StandingFacts): VisitStanding {
  const { lastDecision } = facts;
  if (lastDecision === null) return firstStanding(facts);
  const unseen = facts.position > lastDecision.seenPosition;
  if (lastDecision.decision === 'sent-back') return isAnswered(facts, unseen) ? 'answered' : 'sent-back';
  return unseen ? 'to-review' : lastDecision.decision;
}

function firstStanding({ entries, left }: StandingFacts): VisitStanding {
  if (entries === 0) return 'planned';
  return left ? 'to-review' : 'under-way';
}

function isAnswered({ lastDecision, answeredQuestionIds }: StandingFacts, unseen: boolean): boolean {
  const questions = lastDecision?.questionIds ?? [];
  if (questions.length === 0) return unseen;
  return questions.every((id) => answeredQuestionIds.has(id));
}

const decisionsFrom: Record<VisitStanding, readonly Decision[]> = {
  planned: [],
  'under-way': ['sent-back', 'return-visit'],
  'to-review': ['accepted', 'sent-back', 'return-visit'],
  'sent-back': ['accepted', 'sent-back', 'return-visit'],
  answered: ['accepted', 'sent-back', 'return-visit'],
  accepted: ['sent-back', 'return-visit'],
  'return-visit': [],
};

/** Decisions that may be taken on a visit that stands so. A visit is not accepted twice, nor before the crew has left. */
export function allowedDecisions(standing: VisitStanding): readonly Decision[] {
  return decisionsFrom[standing];
}
