import { sha256 } from '@noble/hashes/sha2.js';
import type { Codec } from '@rimeward/delivery';

const encoder = new TextEncoder();

/**
 * Bytes and digests for sealing entries. Synchronous on purpose: WebCrypto would have to be awaited, and a foreign await
 * commits an IndexedDB transaction.
 */
export const codec: Codec = { utf8: (text) => encoder.encode(text), sha256 };
