import { createHash } from 'node:crypto';
import type { Codec } from '@rimeward/delivery';

const encoder = new TextEncoder();

export const codec: Codec = {
  utf8: (text) => encoder.encode(text),
  sha256: (bytes) => new Uint8Array(createHash('sha256').update(bytes).digest()),
};

export function sha256Hex(bytes: Uint8Array): string {
  return createHash('sha256').update(bytes).digest('hex');
}
