import { Inject, Injectable } from '@nestjs/common';
import { createPrivateKey, createPublicKey, sign, type KeyObject } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';

/** Signs receipts and leases: compact JWS with ES256 (RFC 7515, RFC 7518), so that phones can check them alone. */
@Injectable()
export class Signer {
  private readonly key: KeyObject;
  private readonly publicKey: Record<string, unknown>;

  constructor(@Inject(ENVIRONMENT) environment: Environment) {
    this.key = createPrivateKey(readFileSync(environment.SIGNING_KEY_FILE));
    this.publicKey = { ...createPublicKey(this.key).export({ format: 'jwk' }), alg: 'ES256', use: 'sig' };
  }

  sign(payload: object): string {
    const head = encode({ alg: 'ES256', typ: 'JWT' });
    const text = `${head}.${encode(payload)}`;
    const signature = sign('sha256', Buffer.from(text), { key: this.key, dsaEncoding: 'ieee-p1363' });
    return `${text}.${signature.toString('base64url')}`;
  }

  publicJwk(): Record<string, unknown> {
    return this.publicKey;
  }
}

function encode(value: object): string {
  return Buffer.from(JSON.stringify(value)).toString('base64url');
}
