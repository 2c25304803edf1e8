/** Longest wait that is taken from an answer, ms: a wrong header must not silence a phone for a day. */
export const longestRetryAfterMs = 10 * 60_000;

/**
 * The wait that a `Retry-After` header asks for, ms: seconds or an HTTP date (RFC 9110, 10.2.3); null when there is
 * none or it cannot be read.
 */
export function readRetryAfter(header: string | null, nowMs: number): number | null {
  if (header === null) return null;
  const text = header.trim();
  const waitMs = /^\d+$/.test(text) ? Number(text) * 1_000 : Date.parse(text) - nowMs;
  if (Number.isNaN(waitMs)) return null;
  return Math.min(Math.max(waitMs, 0), longestRetryAfterMs);
}
