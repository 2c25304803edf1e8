import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { foldVisit } from '@rimeward/field-log';
import { visitLogs } from '@rimeward/field-log/testing/arbitraries';
import { cleanVisit, written } from '@rimeward/field-log/testing/clean-visit';
import { testPump, testSystem, testZone } from '@rimeward/field-log/testing/systems';
import { severities } from './finding/severity';
import { findings } from './findings';
import { rules, rulesById } from './registry';
import { clean, idsIn, judge, system } from './testing/judge';

const context = {
  photosElsewhere: {},
  photoTakenMs: {},
  site: { latitude: 40, longitude: -105 },
  signedOff: { '00000000-0000-4000-8000-000000000900': true },
  otherStays: [],
  deviceGaps: [],
  brokenChains: [],
};
const plan = {
  order: system.zones.map((zone) => zone.id),
  airSecondsByZone: Object.fromEntries(system.zones.map((zone) => [zone.id, 90])),
  compressor: { name: 'Towed', verdict: 'suitable' as const },
};

describe('findings', () => {
  it('are none for a clean visit', () => {
    expect(judge(clean)).toEqual([]);
    expect(judge(clean, { context, plan })).toEqual([]);
    expect(judge(clean, { settings: { pressureCapPsi: 60, forbidsWorkingAlone: true }, context })).toEqual(
      [],
    );
  });

  it('are none for a clean visit to a pumped system of many zones', () => {
    const big = testSystem({
      pump: { id: testPump, place: 'Pump house' },
      zones: [1, 2, 3, 4, 5, 6, 7, 8].map((number) => testZone(number)),
    });
    expect(judge(cleanVisit(big), { system: big })).toEqual([]);
  });

  it('are none for a clean visit that drains by hand, without air', () => {
    const drained = testSystem({ removalMethod: 'manual-drain' });
    const airless = new Set([
      'air-connected',
      'regulator-set',
      'people-clear',
      'cautions-read',
      'connection-plugged',
    ]);
    const lines = cleanVisit(drained).filter(
      ({ type }) => !airless.has(type) && !type.startsWith('air-') && type !== 'end-sign-seen',
    );
    expect(idsIn(lines, { system: drained })).toEqual([]);
  });

  it('say nothing yet of what is missing while the work goes on, at any step of a clean visit', () => {
    for (let count = 0; count < clean.length; count += 1) {
      const found = judge(clean.slice(0, count));
      // While a cycle's reading or a photograph may still come, nothing is held against the crew.
      expect([count, found]).toEqual([count, []]);
    }
  });

  it('tell what is missing before leaving, when asked', () => {
    const untilPlug = clean.slice(
      0,
      clean.findIndex((line) => line.type === 'connection-plugged'),
    );
    expect(idsIn(untilPlug, { atTheEnd: true })).toEqual(['plug-not-refitted', 'controller-still-on']);
  });

  it('tell of zones in the order of their numbers, whatever the order on record', () => {
    const shuffled = testSystem({ zones: [testZone(3), testZone(1), testZone(2)] });
    const found = judge(
      cleanVisit(shuffled).filter((line) => line.type !== 'end-sign-seen'),
      { system: shuffled },
    );
    const numbers = found.map((one) => one.ruleId === 'end-sign-missing' && one.params.zoneNumber);
    expect(numbers).toEqual([1, 2, 3]);
  });

  it('never throw, name entries of the log only, and come worst first', () => {
    fc.assert(
      fc.property(visitLogs, fc.boolean(), (log, atTheEnd) => {
        const ids = new Set(log.map((entry) => entry.id));
        const settings = { pressureCapPsi: 40, forbidsWorkingAlone: true };
        const found = findings({ state: foldVisit(log), system, settings, context, plan, atTheEnd });
        for (const finding of found) {
          expect(finding.entryIds.filter((id) => !ids.has(id))).toEqual([]);
          expect(
            Object.values(finding.params).every(
              (value) => typeof value === 'string' || Number.isFinite(value),
            ),
          ).toBe(true);
        }
        const ranks = found.map((finding) => severities.indexOf(finding.severity));
        expect(ranks).toEqual([...ranks].sort());
      }),
      { numRuns: 500 },
    );
  });

  it('do not depend on the order of arrival', () => {
    fc.assert(
      fc.property(
        visitLogs.chain((log) =>
          fc.tuple(fc.constant(log), fc.shuffledSubarray(log, { minLength: log.length })),
        ),
        ([log, arrived]) => {
          const settings = { pressureCapPsi: null, forbidsWorkingAlone: false };
          const judged = (entries: typeof log) => findings({ state: foldVisit(entries), system, settings });
          expect(judged(arrived)).toEqual(judged(log));
        },
      ),
    );
  });

  it('are plain data, the same after a journey through JSON', () => {
    const found = judge(clean.slice(0, 20), { atTheEnd: true });
    expect(found.length).toBeGreaterThan(0);
    expect(JSON.parse(JSON.stringify(found))).toEqual(found);
  });

  it('come from rules that are registered under their own id', () => {
    for (const [id, rule] of Object.entries(rulesById)) expect(rule.id).toBe(id);
    expect(rules).toHaveLength(Object.keys(rulesById).length);
  });

  it('do not count an entry twice', () => {
    const log = written(clean);
    expect(
      findings({
        state: foldVisit([...log, ...log]),
        system,
        settings: { pressureCapPsi: null, forbidsWorkingAlone: false },
      }),
    ).toEqual([]);
  });
});
