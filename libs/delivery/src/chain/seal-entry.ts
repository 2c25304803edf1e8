import { canonicalText } from '../canonical/canonical-text';
import type { Codec } from '../ports/codec';
import { entryHash, noPrevious } from './entry-hash';

/** Newest link of a device's chain. */
export interface ChainHead {
  /** 0 before the first entry. */
  seq: number;
  hash: string;
}

/** Head of a device that has written nothing yet. */
export const emptyChain: ChainHead = { seq: 0, hash: noPrevious };

/** An entry as it is stored and sent for ever after. */
export interface SealedEntry {
  seq: number;
  /** Exact canonical text; its UTF-8 bytes are what is hashed, stored and compared. */
  text: string;
  hash: string;
  /** Length of those bytes. */
  byteLength: number;
}

/**
 * Makes the next entry of a chain: sets `seq` and `prev`, writes the canonical text once and hashes it.
 *
 * @param envelope every field of the envelope but `seq` and `prev`
 * @throws CanonicalFormError when the envelope has no canonical form
 */
export function sealEntry(envelope: object, head: ChainHead, codec: Codec): SealedEntry {
  const seq = head.seq + 1;
  const text = canonicalText({ ...envelope, seq, prev: head.hash });
  const bytes = codec.utf8(text);
  return { seq, text, hash: entryHash(head.hash, bytes, codec.sha256), byteLength: bytes.length };
}
