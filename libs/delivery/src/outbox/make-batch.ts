import type { Codec } from '../ports/codec';
import type { OutgoingEntry } from '../ports/store';

export interface BatchLimits {
  entries: number;
  /** Size of the entries as they travel: as JSON strings in UTF-8. */
  bytes: number;
}

/** The most that one push carries. */
export const fullBatch: BatchLimits = { entries: 100, bytes: 256 * 1024 };

/** Limits after so many failures in a row: half as much each time, down to a single entry. */
export function limitsAfter(failures: number): BatchLimits {
  const divisor = 2 ** Math.min(failures, 20);
  return {
    entries: Math.max(1, Math.floor(fullBatch.entries / divisor)),
    bytes: Math.max(1, Math.floor(fullBatch.bytes / divisor)),
  };
}

/**
 * The longest run from the start of `entries` within the limits, and at least one entry if there is any: an entry that
 * is larger than the limit still has to leave.
 */
export function makeBatch(
  entries: readonly OutgoingEntry[],
  limits: BatchLimits,
  codec: Codec,
): OutgoingEntry[] {
  const batch: OutgoingEntry[] = [];
  let bytes = 0;
  for (const entry of entries) {
    bytes += codec.utf8(JSON.stringify(entry.text)).length + 1;
    if (batch.length > 0 && (batch.length >= limits.entries || bytes > limits.bytes)) break;
    batch.push(entry);
  }
  return batch;
}
