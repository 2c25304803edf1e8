import type { ClockKnowledge } from '../clock/known-time';
import type { ChainMark, Owner } from '../database/schema';

/** What the last save of this tab left behind, so that the next one need not read first. */
export interface KnownHead {
  owner: Owner;
  device: string;
  head: ChainMark;
  clock: ClockKnowledge;
}

/**
 * How long it is trusted, ms. The database itself refuses a number that is taken; the limit bounds how long a tab may
 * go on with a device that was left behind in another tab, or with an old estimate of the clock.
 */
const trustedMs = 10 * 60_000;

let known: (KnownHead & { atMs: number }) | null = null;

/** Hands it over: whoever takes it has to put a new one in its place. Null when nothing is known of this person's chain. */
export function takeKnownHead(owner: Owner, nowMs: number): KnownHead | null {
  const taken = known;
  known = null;
  if (taken === null || taken.owner !== owner) return null;
  return Math.abs(nowMs - taken.atMs) < trustedMs ? taken : null;
}

export function rememberHead(head: KnownHead, nowMs: number): void {
  known = { ...head, atMs: nowMs };
}

/** The next save reads: another device or another database is in use. */
export function forgetHead(): void {
  known = null;
}
