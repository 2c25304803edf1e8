import type { Random } from '../ports/clock';

/** Time between rounds while all is well, ms: from the first to the second, evenly spread. */
export const quietWaitMs = { least: 30_000, most: 60_000 } as const;

const firstBackoffMs = 2_000;
const longestBackoffMs = 60_000;
const shortestBackoffMs = 500;

/**
 * Wait before the next round, ms. After failures the wait is full jitter under a doubling ceiling, so that phones that
 * failed together do not come back together; what the office asked for is never undercut and gets its own jitter.
 *
 * @param failures rounds that failed in a row; 0 when all is well
 * @param retryAfterMs wait that the office asked for, or null
 */
export function nextWaitMs(failures: number, retryAfterMs: number | null, random: Random): number {
  const asked = retryAfterMs === null ? 0 : retryAfterMs + random() * Math.min(retryAfterMs / 2, 10_000);
  if (failures === 0) {
    return Math.max(asked, quietWaitMs.least + random() * (quietWaitMs.most - quietWaitMs.least));
  }
  const ceiling = Math.min(longestBackoffMs, firstBackoffMs * 2 ** Math.min(failures - 1, 10));
  return Math.max(asked, shortestBackoffMs + random() * (ceiling - shortestBackoffMs));
}
