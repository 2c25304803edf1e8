import { Controller, Get, Header } from '@nestjs/common';
import type { PullResponse } from '@rimeward/contracts';
import { z } from 'zod';
import { SignedIn } from '../../auth/access.decorators';
import { CurrentPrincipal } from '../../auth/current-principal.decorator';
import type { Principal } from '../../auth/principal';
import { ZodQuery } from '../../common/zod-body';
import { PullService } from './pull.service';

const querySchema = z.object({
  epoch: z.string().max(100).optional(),
  cursor: z.coerce.number().int().min(0).max(Number.MAX_SAFE_INTEGER).default(0),
  limit: z.coerce.number().int().min(1).max(500).default(200),
});

/** Where phones hear what has changed for their person. */
@Controller('sync')
@SignedIn()
export class PullController {
  constructor(private readonly pulls: PullService) {}

  @Get('pull')
  @Header('Cache-Control', 'no-store')
  pull(
    @CurrentPrincipal() reader: Principal,
    @ZodQuery(querySchema) query: z.infer<typeof querySchema>,
  ): Promise<PullResponse> {
    return this.pulls.pull(reader, { epoch: query.epoch ?? null, cursor: query.cursor, limit: query.limit });
  }
}
