import { createParamDecorator, Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { ProblemException } from '../common/problem.exception';
import { DevicesService } from '../devices/devices.service';

/** A phone, known by its ingest-only credential. It may bring its own chain and photographs and read nothing. */
export interface DevicePrincipal {
  deviceId: string;
  companyId: string;
  userId: string;
  /** A revoked device may still deliver: what it brings is stored and held for a person. */
  revoked: boolean;
}

type DeviceRequest = Request & { device?: DevicePrincipal };

const credential = /^Device ([0-9a-f-]{36})\.([A-Za-z0-9_-]{20,100})$/;

@Injectable()
export class DeviceGuard implements CanActivate {
  constructor(private readonly devices: DevicesService) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<DeviceRequest>();
    const [, deviceId, secret] = credential.exec(request.headers.authorization ?? '') ?? [];
    const device = deviceId && secret ? await this.devices.byCredential(deviceId, secret) : null;
    if (!device) throw new ProblemException('device-unknown');
    request.device = device;
    return true;
  }
}

/** The phone that asks, on routes behind `DeviceGuard`. */
export const CurrentDevice = createParamDecorator(
  (_: unknown, context: ExecutionContext): DevicePrincipal => {
    const device = context.switchToHttp().getRequest<DeviceRequest>().device;
    if (!device) throw new Error('The route has no device guard');
    return device;
  },
);
