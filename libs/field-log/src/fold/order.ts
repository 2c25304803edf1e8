import type { LogEntry } from '../entry/log-entry';

/** An entry with its estimated true time, ms since the epoch. */
export interface TimedEntry {
  entry: LogEntry;
  /** The estimate that orders the log: it never decreases along a device. */
  atMs: number;
  /** The estimate as this entry alone claims it; before `atMs` where the clock was set back. */
  claimedMs: number;
}

/**
 * One total order for any set of entries: along a device by its sequence, across devices by estimated true time.
 * The estimate is the wall clock plus the known offset and never decreases along a device, so that a clock set back
 * cannot turn a device's own order round. Duplicates (same id, or same device and number) are dropped.
 */
export function inLogOrder(entries: readonly LogEntry[]): TimedEntry[] {
  const byDevice = new Map<string, Map<number, LogEntry>>();
  const ids = new Set<string>();
  for (const entry of [...entries].sort(bySequence)) {
    const chain = byDevice.get(entry.device) ?? new Map<number, LogEntry>();
    if (ids.has(entry.id) || chain.has(entry.seq)) continue;
    ids.add(entry.id);
    chain.set(entry.seq, entry);
    byDevice.set(entry.device, chain);
  }
  const timed: TimedEntry[] = [];
  for (const chain of byDevice.values()) {
    let latest = Number.NEGATIVE_INFINITY;
    for (const entry of chain.values()) {
      const claimedMs = estimatedMs(entry);
      latest = Math.max(latest, claimedMs);
      timed.push({ entry, atMs: latest, claimedMs });
    }
  }
  return timed.sort(
    (one, other) =>
      one.atMs - other.atMs ||
      compareText(one.entry.device, other.entry.device) ||
      one.entry.seq - other.entry.seq,
  );
}

/** Wall clock plus offset, ms; the clock is a claim, so a nonsense time is kept as it was told. */
export function estimatedMs(entry: LogEntry): number {
  const wall = Date.parse(entry.time.wall);
  return (Number.isNaN(wall) ? 0 : wall) + (entry.time.offsetMs ?? 0);
}

/** Device, then number, then id: a fixed order, so that which of two rivals stays does not depend on arrival. */
function bySequence(one: LogEntry, other: LogEntry): number {
  return compareText(one.device, other.device) || one.seq - other.seq || compareText(one.id, other.id);
}

function compareText(one: string, other: string): number {
  return one < other ? -1 : one > other ? 1 : 0;
}
