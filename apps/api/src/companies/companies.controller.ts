import { Controller, Get, HttpCode, Put } from '@nestjs/common';
import { companySettingsSchema, type CompanyDocument, type CompanySettings } from '@rimeward/contracts';
import { Roles, SignedIn } from '../auth/access.decorators';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { ZodBody } from '../common/zod-body';
import { CompanyContext } from '../database/company-context';
import { FeedService } from '../sync/feed/feed.service';
import { CompanyDocumentsService } from './company-documents.service';
import { Company } from './entities/company.entity';

@Controller('company')
export class CompaniesController {
  constructor(
    private readonly context: CompanyContext,
    private readonly documents: CompanyDocumentsService,
    private readonly feed: FeedService,
  ) {}

  @SignedIn()
  @Get()
  read(@CurrentPrincipal() person: Principal): Promise<CompanyDocument> {
    return this.context.run(person.companyId, (manager) => this.documents.document(manager));
  }

  @Roles('owner')
  @Put('settings')
  @HttpCode(204)
  async change(
    @CurrentPrincipal() person: Principal,
    @ZodBody(companySettingsSchema) settings: CompanySettings,
  ): Promise<void> {
    await this.context.run(person.companyId, async (manager) => {
      await manager.update(Company, { id: person.companyId }, { settings });
      await this.feed.touch(manager, { kind: 'company' });
    });
  }
}
