import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { foldVisit } from '../fold/fold-visit';
import { visitLogs } from '../testing/arbitraries';
import { cleanVisit, line, written, type Line } from '../testing/clean-visit';
import { testId } from '../testing/builders';
import { testParts, testSystem } from '../testing/systems';
import { airInterlocks, interlockIds, mayStartAir, type InterlockId } from './interlocks';

const system = testSystem();
const zoneId = testId(11);
const ready = cleanVisit(system).slice(0, 11);
const locks = (lines: Line[], ceilingPsi: number | null = 50) =>
  airInterlocks(foldVisit(written(lines)), system, { ceilingPsi, zoneId });
const unmet = (lines: Line[], ceilingPsi: number | null = 50): InterlockId[] =>
  locks(lines, ceilingPsi)
    .filter((lock) => !lock.satisfied)
    .map((lock) => lock.id);
const without = (type: Line['type']) => ready.filter((one) => one.type !== type);

describe('interlocks before air', () => {
  it('hold when everything is set right', () => {
    expect(ready.at(-1)?.type).toBe('people-clear');
    expect(unmet(ready)).toEqual([]);
    expect(mayStartAir(locks(ready))).toBe(true);
  });

  it('hold air back at the start of a visit', () => {
    expect(unmet([])).toEqual(interlockIds.filter((id) => id !== 'zone-open'));
    expect(mayStartAir(locks([]))).toBe(false);
  });

  it.each([
    ['water-off', 'water-off'],
    ['pressure-relieved', 'pressure-relieved'],
    ['part-protected', 'sensitive-parts'],
    ['valve-set', 'backflow-closed'],
    ['regulator-set', 'regulator-under-ceiling'],
    ['cautions-read', 'cautions-read'],
    ['people-clear', 'people-clear'],
  ] as const)('without %s ask for %s', (type, id) => {
    expect(unmet(without(type))).toEqual([id]);
  });

  it('want the connection downstream of the backflow assembly and the couplings pinned', () => {
    const body = { place: 'hose-bib', downstreamOfBackflow: false, couplingsPinned: false } as const;
    expect(unmet([...ready, line('air-connected', body)])).toEqual([
      'connection-downstream',
      'couplings-pinned',
    ]);
  });

  it('want the regulator at or under the ceiling, and hold air back when the ceiling is not known', () => {
    expect(unmet(ready, 49.9)).toEqual(['regulator-under-ceiling']);
    expect(unmet(ready, 50)).toEqual([]);
    expect(unmet(ready, null)).toEqual(['regulator-under-ceiling']);
  });

  it('want an open zone when the screen has chosen none', () => {
    const state = foldVisit(written(ready));
    const open = foldVisit(written([...ready, line('zone-opened', { zoneId })]));
    const lockOf = (given: typeof state) =>
      airInterlocks(given, system, { ceilingPsi: 50, zoneId: null }).find((lock) => lock.id === 'zone-open');
    expect(lockOf(state)?.satisfied).toBe(false);
    expect(lockOf(open)?.satisfied).toBe(true);
  });

  it('take a part that is absent as safe, one that was not found or left as not', () => {
    const outcome = (said: 'none' | 'not-found') =>
      unmet([
        ...ready.filter((one) => one.type !== 'part-protected' && one.type !== 'part-looked-for'),
        line('part-looked-for', { partId: testParts.sensor, kind: 'flow-sensor', outcome: said }),
      ]);
    expect(outcome('none')).toEqual([]);
    expect(outcome('not-found')).toEqual(['sensitive-parts']);
    const left = { partId: testParts.sensor, kind: 'flow-sensor', how: 'left', keptWhere: null } as const;
    expect(unmet([...ready, line('part-protected', left)])).toEqual(['sensitive-parts']);
  });

  it('hold air back for every single one that is not met', () => {
    const types = ['water-off', 'pressure-relieved', 'part-protected', 'valve-set', 'regulator-set'] as const;
    for (const type of types) expect([type, mayStartAir(locks(without(type)))]).toEqual([type, false]);
  });

  it('can be passed with a reason where no person is at risk', () => {
    const passed = [
      ...without('pressure-relieved'),
      line('interlock-passed', { interlock: 'pressure-relieved', reason: 'gauge at zero' }),
    ];
    expect(locks(passed).find((lock) => lock.id === 'pressure-relieved')?.passedBy).toBe('gauge at zero');
    expect(mayStartAir(locks(passed))).toBe(true);
  });

  it('can never be passed where they protect people, whatever has been written', () => {
    fc.assert(
      fc.property(visitLogs, fc.constantFrom(null, 30, 500), (log, ceilingPsi) => {
        const given = airInterlocks(foldVisit(log), system, { ceilingPsi, zoneId });
        const protecting = given.filter((lock) => lock.protectsPeople);
        expect(protecting).toHaveLength(4);
        expect(protecting.every((lock) => lock.passedBy === null)).toBe(true);
        if (protecting.some((lock) => !lock.satisfied)) expect(mayStartAir(given)).toBe(false);
      }),
      { numRuns: 400 },
    );
  });
});
