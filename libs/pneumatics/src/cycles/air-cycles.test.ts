import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { galPerFtOfBore } from '../pipe/water-held';
import { valueOf } from '../testing/fixtures';
import { airCycles, displacementSeconds, type AirCyclesInput } from './air-cycles';
import { headKinds, popsUp, usualCycleCapSeconds } from './head-kind';

const cycles = (change: Partial<AirCyclesInput> = {}) =>
  valueOf(airCycles({ volumeGal: 20, pushedGpm: 15, headKind: 'rotor', ...change }));

describe('ideal displacement', () => {
  for (const [lengthFt, boreIn, gpm, gal, seconds] of [
    [300, 1.049, 15, 13.469, 53.9],
    [400, 1.38, 20, 31.08, 93.2],
    [200, 0.824, 8, 5.54, 41.6],
  ] as const) {
    it(`${lengthFt} ft of ${boreIn} in at ${gpm} gpm: ${gal} gal, ${seconds} s (derived)`, () => {
      const volumeGal = galPerFtOfBore(boreIn) * lengthFt;
      expect(volumeGal).toBeCloseTo(gal, 2);
      expect(displacementSeconds(volumeGal, gpm)).toBeCloseTo(seconds, 1);
    });
  }
});

describe('proposed cycles', () => {
  it('mist is expected 1.75 times later than it can come, the middle of 1.5 to 2 (common practice), and says so', () => {
    const plan = cycles();
    expect(plan.leastSeconds).toBeCloseTo(80, 9);
    expect(plan.expectedSeconds).toBeCloseTo(140, 9);
    expect(plan.why.assumed).toEqual([{ field: 'timeFactor', value: 1.75, why: 'time-factor' }]);
  });
  it('a factor learned from past visits takes its place', () => {
    const plan = cycles({ timeFactor: 2.5 });
    expect(plan.expectedSeconds).toBeCloseTo(200, 9);
    expect(plan.why.assumed).toEqual([]);
  });
  it('at least two, each at most two minutes, with a rest (common practice)', () => {
    expect(cycles()).toMatchObject({
      cycleCount: 2,
      cycleSeconds: 70,
      restSeconds: 60,
      capSeconds: 120,
      totalSeconds: 200,
    });
    expect(cycles({ volumeGal: 0.5 })).toMatchObject({ cycleCount: 2, cycleSeconds: 20 });
    expect(cycles({ volumeGal: 100 })).toMatchObject({ cycleCount: 6, cycleSeconds: 120 });
  });
  it('caps by kind of head; drip has no gears (common practice)', () => {
    for (const kind of headKinds) {
      expect(cycles({ headKind: kind, volumeGal: 500 }).cycleSeconds).toBe(usualCycleCapSeconds[kind]);
    }
    expect(usualCycleCapSeconds.drip).toBe(180);
    expect(headKinds.filter((kind) => !popsUp(kind))).toEqual(['bubbler', 'drip']);
  });
  it('never over the cap, never fewer than two, always long enough in all', () => {
    const figure = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(
        figure(0, 500),
        figure(1, 60),
        fc.constantFrom(...headKinds),
        figure(1, 3),
        (volumeGal, pushedGpm, headKind, timeFactor) => {
          const plan = cycles({ volumeGal, pushedGpm, headKind, timeFactor });
          return (
            plan.cycleCount >= 2 &&
            plan.cycleSeconds <= plan.capSeconds &&
            plan.cycleCount * plan.cycleSeconds >= plan.expectedSeconds - 1e-6 &&
            plan.leastSeconds <= plan.expectedSeconds
          );
        },
      ),
    );
  });
  it('more pipe never takes less air', () => {
    const gal = fc.double({ min: 0, max: 500, noNaN: true });
    fc.assert(
      fc.property(gal, gal, (a, b) => {
        const total = (volumeGal: number): number => {
          const plan = cycles({ volumeGal });
          return plan.expectedSeconds;
        };
        return total(Math.max(a, b)) >= total(Math.min(a, b));
      }),
    );
  });
  it('needs air that moves water, and refuses impossible figures by name', () => {
    const base = { volumeGal: 5, pushedGpm: 0, headKind: 'spray' } as const;
    expect(airCycles(base)).toEqual({ ok: false, error: { kind: 'needs', fields: ['pushedGpm'] } });
    for (const [change, field] of [
      [{ volumeGal: -1 }, 'volumeGal'],
      [{ timeFactor: 0.5 }, 'timeFactor'],
      [{ capSeconds: 1000 }, 'capSeconds'],
      [{ restSeconds: -1 }, 'restSeconds'],
    ] as const) {
      expect(airCycles({ ...base, pushedGpm: 5, ...change })).toMatchObject({ error: { field } });
    }
  });
});
