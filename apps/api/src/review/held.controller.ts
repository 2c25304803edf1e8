import { Controller, Get, Header, HttpCode, Param, Post } from '@nestjs/common';
import { settleHeldRequestSchema, type DevicesResponse, type HeldResponse } from '@rimeward/contracts';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { Roles } from '../auth/access.decorators';
import { ZodBody } from '../common/zod-body';
import { ReviewDevicesService } from './devices.service';
import { HeldService } from './held.service';

@Controller('review')
@Roles('supervisor', 'office', 'owner')
export class HeldController {
  constructor(
    private readonly held: HeldService,
    private readonly phones: ReviewDevicesService,
  ) {}

  @Get('devices')
  @Header('Cache-Control', 'no-store')
  devices(@CurrentPrincipal() reader: Principal): Promise<DevicesResponse> {
    return this.phones.list(reader.companyId);
  }

  @Get('held')
  @Header('Cache-Control', 'no-store')
  list(@CurrentPrincipal() reader: Principal): Promise<HeldResponse> {
    return this.held.list(reader.companyId);
  }

  @Post('held/:id/settle')
  @HttpCode(204)
  settle(
    @CurrentPrincipal() principal: Principal,
    @Param('id') id: string,
    @ZodBody(settleHeldRequestSchema) { note }: { note: string },
  ): Promise<void> {
    return this.held.settle(principal, id, note);
  }
}
