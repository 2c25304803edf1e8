import { Controller, Get } from '@nestjs/common';
import type { SiteListResponse, SiteRecord } from '@rimeward/contracts';
import { z } from 'zod';
import { SignedIn } from '../auth/access.decorators';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { ProblemException } from '../common/problem.exception';
import { ZodParam, ZodQuery } from '../common/zod-body';
import { CompanyContext } from '../database/company-context';
import { SitesService } from './sites.service';

const querySchema = z.object({
  q: z.string().max(100).optional(),
  after: z.string().max(600).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(100),
});

/** The company's sites. A technician sees the sites of his own visits. */
@Controller('sites')
@SignedIn()
export class SitesController {
  constructor(
    private readonly context: CompanyContext,
    private readonly sites: SitesService,
  ) {}

  @Get()
  list(
    @CurrentPrincipal() person: Principal,
    @ZodQuery(querySchema) query: z.infer<typeof querySchema>,
  ): Promise<SiteListResponse> {
    return this.context.run(person.companyId, (manager) => this.sites.list(manager, onlyFor(person), query));
  }

  @Get(':id')
  async read(
    @CurrentPrincipal() person: Principal,
    @ZodParam('id', z.uuid()) id: string,
  ): Promise<SiteRecord> {
    const record = await this.context.run(person.companyId, (manager) =>
      this.sites.record(manager, onlyFor(person), id),
    );
    if (!record) throw new ProblemException('not-found');
    return record;
  }
}

function onlyFor({ role, userId }: Principal): string | null {
  return role === 'technician' ? userId : null;
}
