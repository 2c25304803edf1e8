import type { HeadKind } from '@rimeward/field-log';

/**
 * Longest stretch of air for a kind of head, ms. Two minutes at most for geared heads, which run hot without water;
 * common practice, no source.
 */
export function capMs(kind: HeadKind): number {
  return kind === 'drip' || kind === 'bubbler' ? 180_000 : 120_000;
}

/** Rest between two cycles of a zone, ms; common practice, no source. */
export const restMs = 60_000;
