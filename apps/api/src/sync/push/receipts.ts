import { Injectable } from '@nestjs/common';
import { Signer } from '../../signing/signer';
import type { DevicePrincipal } from '../../auth/device.guard';
import type { ChainHead } from './place-entries';

/** Signed word of the office that it has a device's chain up to an entry; the phone keeps it. */
@Injectable()
export class Receipts {
  constructor(private readonly signer: Signer) {}

  /** Call only after the commit. */
  sign(device: DevicePrincipal, head: ChainHead, at: Date): string {
    return this.signer.sign({
      typ: 'receipt',
      device: device.deviceId,
      company: device.companyId,
      acknowledgedThrough: head.seq,
      hash: head.hash,
      at: at.toISOString(),
    });
  }
}
