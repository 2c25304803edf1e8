import { Controller, HttpCode, Patch } from '@nestjs/common';
import { updateMeRequestSchema, type Language } from '@rimeward/contracts';
import { SignedIn } from '../auth/access.decorators';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { ZodBody } from '../common/zod-body';
import { CompanyContext } from '../database/company-context';
import { User } from './entities/user.entity';

@Controller('users')
export class UsersController {
  constructor(private readonly context: CompanyContext) {}

  @SignedIn()
  @Patch('me')
  @HttpCode(204)
  async updateMe(
    @CurrentPrincipal() { companyId, userId }: Principal,
    @ZodBody(updateMeRequestSchema) { language }: { language: Language },
  ): Promise<void> {
    await this.context.run(companyId, (manager) =>
      manager.update(User, { companyId, id: userId }, { language }),
    );
  }
}
