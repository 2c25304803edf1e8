import { Controller, HttpCode, Post, UseGuards } from '@nestjs/common';
import { pushLimits, pushRequestSchema, type PushRequest, type PushResponse } from '@rimeward/contracts';
import { ForDevices } from '../../auth/access.decorators';
import { CurrentDevice, DeviceGuard, type DevicePrincipal } from '../../auth/device.guard';
import { ProblemException } from '../../common/problem.exception';
import { ZodBody } from '../../common/zod-body';
import { PushService } from './push.service';

/** Where phones bring their log, with the credential of the device: no session is needed for it. */
@Controller('sync')
@ForDevices()
@UseGuards(DeviceGuard)
export class PushController {
  constructor(private readonly pushes: PushService) {}

  @Post('push')
  @HttpCode(200)
  push(
    @CurrentDevice() device: DevicePrincipal,
    @ZodBody(pushRequestSchema) request: PushRequest,
  ): Promise<PushResponse> {
    if (request.device !== device.deviceId) throw new ProblemException('device-unknown');
    if (request.entries.length > 1 && bytesOf(request.entries) > pushLimits.bytes) {
      throw new ProblemException('payload-too-large');
    }
    return this.pushes.push(device, request);
  }
}

function bytesOf(entries: readonly string[]): number {
  return entries.reduce((sum, text) => sum + Buffer.byteLength(text), 0);
}
