import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { visitLogs } from '../testing/arbitraries';
import { foldVisit } from './fold-visit';

const shuffledLogs = visitLogs.chain((log) =>
  fc.record({
    log: fc.constant(log),
    arrived: fc.shuffledSubarray(log, { minLength: log.length }),
    again: fc.subarray(log),
  }),
);

describe('laws of the fold', () => {
  it('does not depend on the order of arrival, nor on what arrives twice', () => {
    fc.assert(
      fc.property(shuffledLogs, ({ log, arrived, again }) => {
        expect(foldVisit([...arrived, ...again])).toEqual(foldVisit(log));
      }),
      { numRuns: 300 },
    );
  });

  it('folds two halves from two phones into the state of the whole', () => {
    fc.assert(
      fc.property(visitLogs, fc.nat(), (log, cut) => {
        const at = log.length === 0 ? 0 : cut % log.length;
        const union = new Set([...log.slice(at), ...log.slice(0, at)]);
        expect(foldVisit([...union])).toEqual(foldVisit(log));
      }),
    );
  });

  it('never throws, and keeps every entry, corrected and withdrawn ones too', () => {
    fc.assert(
      fc.property(visitLogs, (log) => {
        const ids = foldVisit(log).entries.map(({ entry }) => entry.id);
        expect(new Set(ids)).toEqual(new Set(log.map((entry) => entry.id)));
        expect(ids).toHaveLength(log.length);
      }),
      { numRuns: 500 },
    );
  });

  it('keeps each device in the order of its own numbers, with times that never go back', () => {
    fc.assert(
      fc.property(visitLogs, (log) => {
        const last = new Map<string, { seq: number; atMs: number }>();
        for (const { entry, atMs } of foldVisit(log).entries) {
          const before = last.get(entry.device);
          if (before) {
            expect(entry.seq).toBeGreaterThan(before.seq);
            expect(atMs).toBeGreaterThanOrEqual(before.atMs);
          }
          last.set(entry.device, { seq: entry.seq, atMs });
        }
      }),
    );
  });

  it('neither loses nor invents a cycle, and never gives one a negative length', () => {
    fc.assert(
      fc.property(visitLogs, (log) => {
        const state = foldVisit(log);
        const standing = state.entries.filter((one) => one.standing !== 'withdrawn').map((one) => one.entry);
        const started = new Set(
          standing.flatMap((entry) => (entry.type === 'air-started' ? [entry.body.cycleId] : [])),
        );
        const stopped = new Set(
          standing.flatMap((entry) => (entry.type === 'air-stopped' ? [entry.body.cycleId] : [])),
        );
        const cycles = Object.values(state.zones).flatMap((zone) => zone.cycles);
        expect(cycles.map((cycle) => cycle.cycleId).sort()).toEqual([...started].sort());
        expect(new Set(state.runningCycles.map((cycle) => cycle.cycleId))).toEqual(
          new Set([...started].filter((id) => !stopped.has(id))),
        );
        for (const cycle of cycles) expect(cycle.durationMs ?? 0).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 300 },
    );
  });

  it('leaves the inherited members of plain objects alone, whatever an id is called', () => {
    fc.assert(
      fc.property(visitLogs, (log) => {
        foldVisit(log);
        expect(Object.keys(Object.prototype)).toEqual([]);
        expect('winter' in {}).toBe(false);
      }),
    );
  });
});
