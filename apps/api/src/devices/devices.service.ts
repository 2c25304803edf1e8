import { Injectable } from '@nestjs/common';
import type { EnrolDeviceResponse } from '@rimeward/contracts';
import { createHash, randomBytes, randomUUID, timingSafeEqual } from 'node:crypto';
import type { DevicePrincipal } from '../auth/device.guard';
import type { Principal } from '../auth/principal';
import { ProblemException } from '../common/problem.exception';
import { CompanyContext } from '../database/company-context';
import { Signer } from '../signing/signer';
import { Device } from './entities/device.entity';

/** The offline lease: how long a phone shows customers' data after its last contact, seconds. */
const leaseSeconds = 72 * 3_600;

/** Enrols phones, knows them by their credential, signs their leases, withdraws them. */
@Injectable()
export class DevicesService {
  constructor(
    private readonly context: CompanyContext,
    private readonly signer: Signer,
  ) {}

  async enrol(person: Principal, about: { name: string; platform: string }): Promise<EnrolDeviceResponse> {
    const secret = randomBytes(32).toString('base64url');
    const device = Object.assign(new Device(), {
      companyId: person.companyId,
      id: randomUUID(),
      userId: person.userId,
      ...about,
      secretHash: hashOf(secret),
      enrolledAt: new Date(),
      revokedAt: null,
    });
    await this.context.run(person.companyId, (manager) => manager.insert(Device, device));
    return { deviceId: device.id, ingestSecret: secret, ...this.lease(person, device.id) };
  }

  async renewLease(
    person: Principal,
    deviceId: string,
  ): Promise<{ lease: string; verifyKey: Record<string, unknown> }> {
    const device = await this.context.run(person.companyId, (manager) =>
      manager.findOneBy(Device, { companyId: person.companyId, id: deviceId, userId: person.userId }),
    );
    if (!device) throw new ProblemException('not-found');
    if (device.revokedAt) throw new ProblemException('device-revoked');
    return this.lease(person, deviceId);
  }

  /** Withdraws a phone: what it still brings is stored and held, and it gets no lease. */
  async revoke(person: Principal, deviceId: string): Promise<void> {
    const done = await this.context.run(person.companyId, (manager) =>
      manager.update(Device, { companyId: person.companyId, id: deviceId }, { revokedAt: new Date() }),
    );
    if (done.affected !== 1) throw new ProblemException('not-found');
  }

  /** The device of a credential, or null; the comparison takes the same time either way. */
  async byCredential(deviceId: string, secret: string): Promise<DevicePrincipal | null> {
    const device = await this.context.lookUp({ by: 'device', value: deviceId }, (manager) =>
      manager.findOneBy(Device, { id: deviceId }),
    );
    const known = device?.secretHash ?? Buffer.alloc(32);
    if (!timingSafeEqual(known, hashOf(secret)) || !device) return null;
    return {
      deviceId,
      companyId: device.companyId,
      userId: device.userId,
      revoked: device.revokedAt !== null,
    };
  }

  private lease(person: Principal, device: string): { lease: string; verifyKey: Record<string, unknown> } {
    const iat = Math.floor(Date.now() / 1_000);
    const lease = this.signer.sign({
      typ: 'offline-lease',
      sub: person.userId,
      company: person.companyId,
      device,
      iat,
      exp: iat + leaseSeconds,
    });
    return { lease, verifyKey: this.signer.publicJwk() };
  }
}

function hashOf(secret: string): Buffer {
  return createHash('sha256').update(secret).digest();
}
