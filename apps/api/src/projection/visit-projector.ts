import { Injectable } from '@nestjs/common';
import type { Review, VisitStanding } from '@rimeward/contracts';
import { foldVisit, parseEntry, type LogEntry, type VisitState } from '@rimeward/field-log';
import type { EntityManager } from 'typeorm';
import { lockVisit, reviewsOf } from '../review/decision-rows';
import { standingOf } from '../review/visit-standing';
import { VisitDocumentsService } from '../visits/visit-documents.service';
import { judge } from './judge';
import { saveProjection } from './projection-rows';
import { clearMark, readMark } from './stale-rows';
import { figuresOf } from './summary';
import { logOfVisit, type VisitLog } from './visit-log';

/** Makes the at-a-glance copy of one visit: the fold of its entries, the findings, and where it stands. */
@Injectable()
export class VisitProjector {
  constructor(private readonly documents: VisitDocumentsService) {}

  /** A visit that does not exist any more leaves only its mark behind, which is taken away. */
  async project(manager: EntityManager, visitId: string): Promise<void> {
    await lockVisit(manager, visitId);
    const mark = await readMark(manager, visitId);
    const [document] = await this.documents.documents(manager, [visitId]);
    if (document !== undefined) {
      const { state, log, standing } = await readVisit(manager, visitId);
      await saveProjection(manager, {
        document,
        ...figuresOf(document, state),
        ...(await judge(manager, document, state)),
        standing,
        actorIds: state.actors,
        heldEntries: log.held,
        position: log.position,
      });
    }
    if (mark !== null) await clearMark(manager, visitId, mark);
  }

  /** Without reading the entries: a visit whose entries cannot be folded must still be seen. Its mark stays. */
  async projectPlainly(manager: EntityManager, visitId: string): Promise<void> {
    await lockVisit(manager, visitId);
    const [document] = await this.documents.documents(manager, [visitId]);
    if (document === undefined) return;
    const log = await logOfVisit(manager, visitId);
    const state = foldVisit([]);
    await saveProjection(manager, {
      document,
      ...figuresOf(document, state),
      findings: [],
      rulesVersion: 'none',
      atTheEnd: true,
      standing: standingFrom(log, state, await reviewsOf(manager, [visitId])),
      actorIds: [],
      heldEntries: log.held,
      position: log.position,
    });
  }
}

export interface VisitReading {
  log: VisitLog;
  state: VisitState;
  reviews: Review[];
  standing: VisitStanding;
}

/** What log and decisions say of a visit right now. */
export async function readVisit(manager: EntityManager, visitId: string): Promise<VisitReading> {
  const log = await logOfVisit(manager, visitId);
  const reviews = await reviewsOf(manager, [visitId]);
  const state = foldVisit(log.texts.map(readAccepted));
  return { log, state, reviews, standing: standingFrom(log, state, reviews) };
}

function readAccepted(text: string): LogEntry {
  const parsed = parseEntry(text);
  // Checked when it was pushed; a type that has been taken out since is a fault of this build, to be seen and repaired.
  if (!parsed.ok) throw new Error(`a stored entry cannot be read: ${parsed.fault}`);
  return parsed.entry;
}

function standingFrom(log: VisitLog, state: VisitState, reviews: readonly Review[]): VisitStanding {
  const last = reviews.at(-1);
  return standingOf({
    entries: log.texts.length,
    left: state.left !== null,
    position: log.position,
    lastDecision: last
      ? {
          decision: last.decision,
          seenPosition: last.seenPosition,
          questionIds: last.questions.map(({ id }) => id),
        }
      : null,
    answeredQuestionIds: new Set(state.answers.map(({ questionId }) => questionId)),
  });
}
