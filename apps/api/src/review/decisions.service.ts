import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { DecideRequest, Review } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import type { Principal } from '../auth/principal';
import { ProblemException } from '../common/problem.exception';
import { CompanyContext } from '../database/company-context';
import { ProjectionService } from '../projection/projection.service';
import { readVisit } from '../projection/visit-projector';
import { FeedService, markStale } from '../sync/feed/feed.service';
import { VisitDocumentsService } from '../visits/visit-documents.service';
import { ReturnVisits } from './return-visits';
import { appendReview, lockVisit } from './decision-rows';
import { allowedDecisions } from './visit-standing';

/** Takes decisions on visits. Of two supervisors who decide at once, one wins and the other is told that something has changed. */
@Injectable()
export class DecisionsService {
  constructor(
    private readonly context: CompanyContext,
    private readonly documents: VisitDocumentsService,
    private readonly projections: ProjectionService,
    private readonly returnVisits: ReturnVisits,
    private readonly feed: FeedService,
  ) {}

  async decide(principal: Principal, visitId: string, request: DecideRequest): Promise<Review> {
    const review = await this.context.run(principal.companyId, (manager) =>
      this.decideLocked(manager, principal, visitId, request),
    );
    await this.projections.freshen(principal.companyId);
    return review;
  }

  private async decideLocked(
    manager: EntityManager,
    principal: Principal,
    visitId: string,
    request: DecideRequest,
  ): Promise<Review> {
    await lockVisit(manager, visitId);
    const [document] = await this.documents.documents(manager, [visitId]);
    if (document === undefined) throw new ProblemException('not-found');
    const { reviews, standing, state, log } = await readVisit(manager, visitId);
    if (reviews.length !== request.expectedNumber) throw new ProblemException('changed-since-opened');
    if (!allowedDecisions(standing).includes(request.decision)) throw new ProblemException('wrong-step');
    if (request.decision === 'accepted' && state.actors.includes(principal.userId)) {
      throw new ProblemException('not-allowed');
    }
    checkRequest(request, log.position);
    const review: Review = {
      id: randomUUID(),
      visitId,
      number: reviews.length + 1,
      decision: request.decision,
      remark: request.remark,
      questions: request.questions,
      by: { id: principal.userId, name: principal.name },
      at: new Date().toISOString(),
      seenPosition: request.seenPosition,
    };
    await appendReview(manager, review);
    await markStale(manager, [visitId]);
    if (review.decision === 'return-visit')
      await this.returnVisits.plan(manager, principal.companyId, review);
    await this.feed.touch(manager, { kind: 'review', id: review.id, visitId });
    return review;
  }
}

/** Sending back says what is wanted; nobody has seen what has not arrived yet. */
function checkRequest(request: DecideRequest, position: number): void {
  const saysNothing = request.questions.length === 0 && (request.remark ?? '').trim() === '';
  if (request.decision === 'sent-back' && saysNothing) {
    throw new ProblemException('validation-failed', { fields: [{ path: 'questions', fault: 'required' }] });
  }
  if (request.seenPosition > position) {
    throw new ProblemException('validation-failed', { fields: [{ path: 'seenPosition', fault: 'invalid' }] });
  }
  if (new Set(request.questions.map(({ id }) => id)).size !== request.questions.length) {
    throw new ProblemException('validation-failed', { fields: [{ path: 'questions', fault: 'invalid' }] });
  }
}
