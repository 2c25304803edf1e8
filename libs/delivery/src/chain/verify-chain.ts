import type { Codec } from '../ports/codec';
import { entryHash } from './entry-hash';
import { readHeader } from './entry-header';
import type { ChainHead } from './seal-entry';

/** What is wrong with the first bad link. */
export type ChainFault = 'unreadable' | 'other-device' | 'wrong-sequence' | 'wrong-previous' | 'wrong-hash';

export type ChainVerdict = { ok: true; head: ChainHead } | { ok: false; index: number; fault: ChainFault };

/**
 * Checks that entries, in order, continue one device's chain without a gap, and that each stored hash is the hash of
 * the stored text.
 *
 * @param from the link before the first entry
 */
export function verifyChain(
  device: string,
  from: ChainHead,
  entries: readonly { text: string; hash: string }[],
  codec: Codec,
): ChainVerdict {
  let head = from;
  for (const [index, entry] of entries.entries()) {
    const fault = faultOf(device, head, entry, codec);
    if (fault !== null) return { ok: false, index, fault };
    head = { seq: head.seq + 1, hash: entry.hash };
  }
  return { ok: true, head };
}

function faultOf(
  device: string,
  head: ChainHead,
  entry: { text: string; hash: string },
  codec: Codec,
): ChainFault | null {
  const header = readHeader(entry.text);
  if (header === null) return 'unreadable';
  if (header.device !== device) return 'other-device';
  if (header.seq !== head.seq + 1) return 'wrong-sequence';
  if (header.prev !== head.hash) return 'wrong-previous';
  if (entryHash(head.hash, codec.utf8(entry.text), codec.sha256) !== entry.hash) return 'wrong-hash';
  return null;
}
