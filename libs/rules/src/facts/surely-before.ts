import type { FoldedEntry } from '@rimeward/field-log';

/** Two phones that have both been measured against the office agree to within this, ms. */
const measuredDoubtMs = 5_000;

/**
 * Whether one entry came before another beyond doubt. On one phone its numbers say so; on two phones their clocks have to be
 * further apart than they may be wrong: a few seconds where both were measured against the office, `clockMinutes` where not.
 */
export function surelyBefore(one: FoldedEntry, other: FoldedEntry, clockMinutes: number): boolean {
  if (one.entry.device === other.entry.device) return one.entry.seq < other.entry.seq;
  const measured = one.entry.time.offsetMs !== null && other.entry.time.offsetMs !== null;
  return other.atMs - one.atMs > (measured ? measuredDoubtMs : clockMinutes * 60_000);
}
