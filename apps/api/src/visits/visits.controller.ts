import { Controller, Get } from '@nestjs/common';
import type { VisitDocument } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { z } from 'zod';
import { SignedIn } from '../auth/access.decorators';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { ProblemException } from '../common/problem.exception';
import { ZodParam, ZodQuery } from '../common/zod-body';
import { CompanyContext } from '../database/company-context';
import { VisitDocumentsService } from './visit-documents.service';

const rangeSchema = z.object({ from: z.iso.date(), to: z.iso.date() });

/** The plan. A technician sees the visits that he is assigned to; everybody else sees all of the company's. */
@Controller('visits')
export class VisitsController {
  constructor(
    private readonly context: CompanyContext,
    private readonly documents: VisitDocumentsService,
  ) {}

  @SignedIn()
  @Get()
  list(
    @CurrentPrincipal() person: Principal,
    @ZodQuery(rangeSchema) { from, to }: z.infer<typeof rangeSchema>,
  ): Promise<VisitDocument[]> {
    return this.context.run(person.companyId, async (manager) => {
      const ids = await visibleIds(manager, person, 'v.date between $2 and $3', [from, to]);
      return this.documents.documents(manager, ids);
    });
  }

  @SignedIn()
  @Get(':id')
  async read(
    @CurrentPrincipal() person: Principal,
    @ZodParam('id', z.uuid()) id: string,
  ): Promise<VisitDocument> {
    const [document] = await this.context.run(person.companyId, async (manager) => {
      const ids = await visibleIds(manager, person, 'v.id = $2 and $3::text is null', [id, null]);
      return this.documents.documents(manager, ids);
    });
    if (!document) throw new ProblemException('not-found');
    return document;
  }
}

/** At most 500 visits that this person may see and that meet the condition on `v`. */
async function visibleIds(
  manager: EntityManager,
  person: Principal,
  condition: string,
  [second, third]: [unknown, unknown],
): Promise<string[]> {
  const reader = person.role === 'technician' ? person.userId : null;
  const rows = await manager.query<{ id: string }[]>(
    `select v.id from visits v
     where v.company_id = nullif(current_setting('app.company', true), '')::uuid and ${condition}
       and ($1::uuid is null or exists (
         select from visit_assignments a
         where a.company_id = v.company_id and a.visit_id = v.id and a.user_id = $1))
     order by v.date, v.sequence limit 500`,
    [reader, second, third],
  );
  return rows.map(({ id }) => id);
}
