import { Controller, Get, Header, Post } from '@nestjs/common';
import {
  decideRequestSchema,
  type DecideRequest,
  type QueueResponse,
  type Review,
  type VisitRecord,
} from '@rimeward/contracts';
import { z } from 'zod';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { Roles } from '../auth/access.decorators';
import { ZodBody, ZodParam, ZodQuery } from '../common/zod-body';
import { DecisionsService } from './decisions.service';
import { queueQuerySchema, type QueueQuery } from './queue-query';
import { QueueService } from './queue.service';
import { RecordService } from './record.service';

@Controller('review/visits')
export class ReviewController {
  constructor(
    private readonly queue: QueueService,
    private readonly records: RecordService,
    private readonly decisions: DecisionsService,
  ) {}

  @Get()
  @Roles('supervisor', 'office', 'owner')
  @Header('Cache-Control', 'no-store')
  list(
    @CurrentPrincipal() reader: Principal,
    @ZodQuery(queueQuerySchema) query: QueueQuery,
  ): Promise<QueueResponse> {
    return this.queue.page(reader.companyId, query);
  }

  @Get(':id')
  @Roles('supervisor', 'office', 'owner')
  @Header('Cache-Control', 'no-store')
  record(@CurrentPrincipal() reader: Principal, @ZodParam('id', z.uuid()) id: string): Promise<VisitRecord> {
    return this.records.record(reader.companyId, id);
  }

  @Post(':id/decisions')
  @Roles('supervisor', 'owner')
  decide(
    @CurrentPrincipal() principal: Principal,
    @ZodParam('id', z.uuid()) id: string,
    @ZodBody(decideRequestSchema) request: DecideRequest,
  ): Promise<Review> {
    return this.decisions.decide(principal, id, request);
  }
}
