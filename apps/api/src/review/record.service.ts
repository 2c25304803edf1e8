import { Injectable } from '@nestjs/common';
import type { VisitRecord } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { ProblemException } from '../common/problem.exception';
import { CompanyContext } from '../database/company-context';
import { photosOfVisit } from '../photos/visit-photos';
import { judge } from '../projection/judge';
import { readVisit } from '../projection/visit-projector';
import { entriesOfVisit } from '../sync/log/log-reader';
import { VisitDocumentsService } from '../visits/visit-documents.service';
import { companySetting as company } from '../database/protect-table';

/** Everything that a supervisor decides on: made from the log itself, not from the at-a-glance copy. */
@Injectable()
export class RecordService {
  constructor(
    private readonly context: CompanyContext,
    private readonly documents: VisitDocumentsService,
  ) {}

  async record(companyId: string, visitId: string): Promise<VisitRecord> {
    return this.context.run(companyId, async (manager) => {
      const [document] = await this.documents.documents(manager, [visitId]);
      if (document === undefined) throw new ProblemException('not-found');
      const { standing, reviews, state, log } = await readVisit(manager, visitId);
      const { findings, rulesVersion } = await judge(manager, document, state);
      return {
        visit: { ...document, reviews },
        standing,
        entries: await entriesOfVisit(manager, visitId),
        findings,
        rulesVersion,
        photos: await photosOfVisit(manager, visitId),
        reviews,
        people: await peopleOf(manager, [
          ...state.actors,
          ...document.assigned.map(({ userId }) => userId),
          ...reviews.map(({ by }) => by.id),
        ]),
        position: log.position,
      };
    });
  }
}

async function peopleOf(
  manager: EntityManager,
  ids: readonly string[],
): Promise<{ id: string; name: string }[]> {
  return manager.query<{ id: string; name: string }[]>(
    `select id, name from users where company_id = ${company} and id = any($1::uuid[]) order by name, id`,
    [[...new Set(ids)]],
  );
}
