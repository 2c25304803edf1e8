import type { FoldedEntry } from '@rimeward/field-log';
import type { VisitFacts } from '../../facts/facts';
import { ownRecord, type Rule } from '../../finding/rule';

/** Each entry with the one that the same phone wrote before it on this visit. */
function* steps({ state }: VisitFacts): Generator<{ before: FoldedEntry; after: FoldedEntry }> {
  const last = new Map<string, FoldedEntry>();
  for (const after of state.entries) {
    const before = last.get(after.entry.device);
    if (before) yield { before, after };
    last.set(after.entry.device, after);
  }
}

const minutes = (ms: number): number => Math.round(ms / 60_000);

/** A phone claims a time before that of its earlier entry: its clock was set back. Times of this visit are in doubt. */
export const clockSetBack: Rule<'clock-set-back'> = {
  id: 'clock-set-back',
  severity: 'gap',
  basis: ownRecord,
  find(facts, report) {
    const backs = new Map<string, { entryIds: string[]; worstMs: number; times: number }>();
    for (const { before, after } of steps(facts)) {
      const backMs = before.claimedMs - after.claimedMs;
      if (backMs <= facts.thresholds.clockMinutes * 60_000) continue;
      const { device } = after.entry;
      const known = backs.get(device) ?? { entryIds: [], worstMs: 0, times: 0 };
      known.entryIds.push(before.entry.id, after.entry.id);
      known.worstMs = Math.max(known.worstMs, backMs);
      known.times += 1;
      backs.set(device, known);
    }
    for (const [device, { entryIds, worstMs, times }] of backs) {
      report([...new Set(entryIds)], { device, minutes: minutes(worstMs), times });
    }
  },
};

/** The difference between a phone's clock and the office's jumped: somebody changed the clock during the visit. */
export const clockChanged: Rule<'clock-changed'> = {
  id: 'clock-changed',
  severity: 'note',
  basis: ownRecord,
  find(facts, report) {
    for (const { before, after } of steps(facts)) {
      const offsetBeforeMs = before.entry.time.offsetMs;
      const { offsetMs } = after.entry.time;
      if (offsetMs === null || offsetBeforeMs === null) continue;
      const jumpMs = Math.abs(offsetMs - offsetBeforeMs);
      if (jumpMs <= facts.thresholds.clockMinutes * 60_000) continue;
      report([before.entry.id, after.entry.id], { device: after.entry.device, minutes: minutes(jumpMs) });
    }
  },
};

/** A phone claims a time at which this product did not exist: its clock stands wrong. The entries count all the same. */
export const clockImplausible: Rule<'clock-implausible'> = {
  id: 'clock-implausible',
  severity: 'gap',
  basis: ownRecord,
  find({ state, thresholds }, report) {
    const early = new Map<string, string[]>();
    for (const { entry, claimedMs } of state.entries) {
      if (claimedMs >= thresholds.earliestMs) continue;
      const entryIds = early.get(entry.device);
      if (entryIds) entryIds.push(entry.id);
      else early.set(entry.device, [entry.id]);
    }
    for (const [device, entryIds] of early) report(entryIds, { device, entries: entryIds.length });
  },
};
