import { Injectable } from '@nestjs/common';
import type { Review } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { CompanyDocumentsService } from '../companies/company-documents.service';
import { shiftDay, today } from '../sync/pull/window';
import { VisitsService } from '../visits/visits.service';

/** Plans the visit that a review has ordered: tomorrow by the company's calendar, by the same people, with the reason. */
@Injectable()
export class ReturnVisits {
  constructor(
    private readonly companies: CompanyDocumentsService,
    private readonly visits: VisitsService,
  ) {}

  async plan(manager: EntityManager, companyId: string, review: Review): Promise<string> {
    const { settings } = await this.companies.document(manager);
    const date = shiftDay(today(new Date(review.at), settings.timeZone), 1);
    const planned = await this.visits.planAgain(manager, companyId, review.visitId, {
      date,
      note: noteOf(review),
    });
    if (planned === null) throw new Error('a visit that has just been read is gone');
    return planned;
  }
}

/** What the crew reads before it opens the gate. */
function noteOf({ remark, questions }: Review): string | null {
  const lines = [remark ?? '', ...questions.map(({ text }) => text)].map((line) => line.trim());
  const note = lines.filter((line) => line !== '').join('\n');
  return note === '' ? null : note;
}
