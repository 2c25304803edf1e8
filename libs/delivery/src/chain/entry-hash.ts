import type { Sha256 } from '../ports/codec';
import { fromHex, toHex } from './hex';

/** What stands as the previous hash of a device's first entry: 32 zero bytes. */
export const noPrevious = '0'.repeat(64);

/**
 * Hash that binds an entry to everything before it: SHA-256(previous hash as 32 raw bytes || exact bytes), in lower-case
 * hexadecimal digits.
 *
 * @param prevHex hash of the device's previous entry, 64 hexadecimal digits; `noPrevious` for the first
 * @param bytes exact bytes of the entry, as sent and stored
 * @throws RangeError when `prevHex` is not 64 hexadecimal digits
 */
export function entryHash(prevHex: string, bytes: Uint8Array, sha256: Sha256): string {
  const prev = fromHex(prevHex);
  if (prev?.length !== 32) throw new RangeError('previous hash must be 64 hexadecimal digits');
  const joined = new Uint8Array(32 + bytes.length);
  joined.set(prev, 0);
  joined.set(bytes, 32);
  return toHex(sha256(joined));
}
