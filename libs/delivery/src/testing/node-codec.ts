import { createHash } from 'node:crypto';
import type { Codec } from '../ports/codec';

/** The codec of a Node host, for tests. */
export const nodeCodec: Codec = {
  utf8: (text) => new TextEncoder().encode(text),
  sha256: (bytes) => new Uint8Array(createHash('sha256').update(bytes).digest()),
};
