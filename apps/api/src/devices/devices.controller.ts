import { Controller, Header, HttpCode, Post } from '@nestjs/common';
import { enrolDeviceRequestSchema, type EnrolDeviceResponse } from '@rimeward/contracts';
import { z } from 'zod';
import { Roles, SignedIn } from '../auth/access.decorators';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { ZodBody, ZodParam } from '../common/zod-body';
import { DevicesService } from './devices.service';

@Controller('devices')
export class DevicesController {
  constructor(private readonly devices: DevicesService) {}

  @SignedIn()
  @Post()
  @Header('Cache-Control', 'no-store')
  enrol(
    @CurrentPrincipal() person: Principal,
    @ZodBody(enrolDeviceRequestSchema) about: { name: string; platform: string },
  ): Promise<EnrolDeviceResponse> {
    return this.devices.enrol(person, about);
  }

  @SignedIn()
  @Post(':id/lease')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  lease(
    @CurrentPrincipal() person: Principal,
    @ZodParam('id', z.uuid()) id: string,
  ): Promise<{ lease: string }> {
    return this.devices.renewLease(person, id);
  }

  @Roles('supervisor', 'owner')
  @Post(':id/revoke')
  @HttpCode(204)
  revoke(@CurrentPrincipal() person: Principal, @ZodParam('id', z.uuid()) id: string): Promise<void> {
    return this.devices.revoke(person, id);
  }
}
