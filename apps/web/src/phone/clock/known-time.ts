import { database } from '../database/database';
import type { PhoneDatabase } from '../database/database';

/** What the phone knows about its own clock. */
export interface ClockKnowledge {
  /** Server minus phone, ms; null before the first contact. */
  offsetMs: number | null;
  /** Phone's wall clock when the offset was estimated. */
  estimatedAtMs: number | null;
  /** Latest corrected time that has been seen: time does not run backwards. */
  latestSeenMs: number;
}

export const clockKey = 'clock';
const nothingKnown: ClockKnowledge = { offsetMs: null, estimatedAtMs: null, latestSeenMs: 0 };

export function clockOf(row: { value: unknown } | undefined): ClockKnowledge {
  return (row?.value as ClockKnowledge | undefined) ?? nothingKnown;
}

export async function readClock(db: PhoneDatabase = database()): Promise<ClockKnowledge> {
  return clockOf(await db.meta.get(clockKey));
}

/** Best estimate of the true time, ms since the epoch. */
export function correctedNow(clock: ClockKnowledge, wallMs: number): number {
  return wallMs + (clock.offsetMs ?? 0);
}

/** After an answer of the office: its clock is the truth, and the latest time seen with it. */
export async function noteServerTime(
  contact: { serverTimeMs: number; sentMs: number; receivedMs: number },
  db: PhoneDatabase = database(),
): Promise<void> {
  const offsetMs = Math.round(contact.serverTimeMs - (contact.sentMs + contact.receivedMs) / 2);
  const value: ClockKnowledge = {
    offsetMs,
    estimatedAtMs: contact.receivedMs,
    latestSeenMs: contact.serverTimeMs,
  };
  await db.meta.put({ key: clockKey, value });
}

/** Without the office: remembers that this much time has passed at least. */
export async function noteTimePassing(wallMs: number, db: PhoneDatabase = database()): Promise<void> {
  await db.transaction('rw', db.meta, async () => {
    const clock = clockOf(await db.meta.get(clockKey));
    const nowMs = correctedNow(clock, wallMs);
    if (nowMs <= clock.latestSeenMs) return;
    await db.meta.put({ key: clockKey, value: { ...clock, latestSeenMs: nowMs } });
  });
}
