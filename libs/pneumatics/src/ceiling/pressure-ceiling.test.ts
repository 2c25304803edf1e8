import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { materials, type Material } from '../pipe/material';
import type { PipeRun } from '../pipe/pipe-run';
import { nominalSizesIn } from '../pipe/size-of';
import { valueOf } from '../testing/fixtures';
import { ceilingPolicies, type CeilingPolicyId } from './policies';
import { pressureCeiling, type CeilingInput } from './pressure-ceiling';

const run = (material: Material, nominalIn = 1, ratedPsi: number | null = null): PipeRun => ({
  id: `${material}-${nominalIn}`,
  material,
  nominalIn,
  lengthFt: 100,
  ratedPsi,
});
const ceiling = (runs: PipeRun[], more: Partial<CeilingInput> = {}) =>
  valueOf(pressureCeiling({ runs, parts: [], companyCapPsi: null, airTemperatureF: 60, ...more }));

describe('policies', () => {
  it('80 psi for rigid PVC, 50 for polyethylene by default (Colorado State University Extension, second-hand)', () => {
    expect(ceiling([run('pvc-sch40')])).toMatchObject({ pressurePsi: 80, setBy: 'rigid-pvc' });
    expect(ceiling([run('pe-sidr15')])).toMatchObject({ pressurePsi: 50, setBy: 'polyethylene' });
  });
  it('a PVC main with polyethylene laterals may have 50 (lowest part, derived)', () => {
    const mixed = ceiling([run('pvc-sch40', 1.5), run('pe-sidr15')]);
    expect(mixed).toMatchObject({ pressurePsi: 50, setBy: 'polyethylene' });
    expect(mixed.candidates.map(({ kind }) => kind).slice(0, 1)).toEqual(['polyethylene']);
  });
  it('at most 70 psi (City of Greeley, published) and 50 psi (Iowa State University Extension 2009, published), by name', () => {
    expect(ceiling([run('pvc-sch40')], { policyId: 'municipal-70' }).pressurePsi).toBe(70);
    expect(ceiling([run('pe-sidr9')], { policyId: 'municipal-70' }).pressurePsi).toBe(50);
    expect(ceiling([run('pvc-sch40')], { policyId: 'extension-50' }).pressurePsi).toBe(50);
  });
  it('no policy allows more than the default (Colorado State University Extension, second-hand)', () => {
    for (const policy of Object.values(ceilingPolicies)) {
      expect(policy.rigidPsi).toBeLessThanOrEqual(80);
      expect(policy.polyethylenePsi).toBeLessThanOrEqual(50);
      expect(policy.unknownPsi).toBeLessThanOrEqual(50);
    }
  });
  it('unknown pipe, and no pipe at all, get the lowest of the policy and are named as missing', () => {
    const unknown = ceiling([run('unknown')]);
    expect(unknown).toMatchObject({ pressurePsi: 50, setBy: 'unknown' });
    expect(unknown.why.missing).toEqual(['unknown-1.material']);
    expect(ceiling([])).toMatchObject({ pressurePsi: 50, setBy: 'unknown', why: { missing: ['runs'] } });
  });
  it('says which policy it took by itself', () => {
    expect(ceiling([run('pvc-sch40')]).why.assumed).toContainEqual({
      field: 'policyId',
      value: 'extension',
      why: 'default-policy',
    });
    expect(ceiling([run('pvc-sch40')], { policyId: 'extension' }).why.assumed).toEqual([]);
  });
});

describe('the lowest rated part rules', () => {
  it('SDR 26 at 110 F: 57.6 psi, under the 80 of the policy (PPI Recommendation C, second-hand; USDA NRCS, published)', () => {
    const hot = ceiling([run('pvc-sdr26')], { airTemperatureF: 110 });
    expect(hot.setBy).toBe('pipe-rating');
    expect(hot.pressurePsi).toBeCloseTo(57.6, 9);
    expect(hot.coldPressurePsi).toBe(80);
  });
  it('SDR 21 at 73 F: 144 psi, so the 80 rule (USDA NRCS, published)', () => {
    const cold = ceiling([run('pvc-sdr21')], { airTemperatureF: 73 });
    expect(cold.pressurePsi).toBe(80);
    expect(cold.candidates[1]?.limitPsi).toBeCloseTo(144, 9);
  });
  it('a valve that somebody read, and a cap of the company', () => {
    const parts = [{ name: 'valve', ratedPsi: 45 }];
    expect(ceiling([run('pvc-sch40')], { parts })).toMatchObject({ pressurePsi: 45, setBy: 'lowest-part' });
    expect(ceiling([run('pvc-sch40')], { parts, companyCapPsi: 40 })).toMatchObject({
      pressurePsi: 40,
      setBy: 'company-cap',
    });
  });
  it('air hotter than PVC is rated for allows nothing until it is cooled (PPI Recommendation C, second-hand)', () => {
    expect(ceiling([run('pvc-sch40')], { airTemperatureF: 150 })).toMatchObject({
      pressurePsi: 0,
      setBy: 'pipe-rating',
      coldPressurePsi: 80,
    });
    expect(ceiling([run('unknown')], { airTemperatureF: 150 })).toMatchObject({
      pressurePsi: 0,
      coldPressurePsi: 50,
    });
  });
  it('copper and steel stand the heat of PVC: their own tables rule', () => {
    expect(ceiling([run('galvanized')], { airTemperatureF: 200 }).pressurePsi).toBe(80);
    expect(ceiling([run('copper-l')], { airTemperatureF: 200 }).pressurePsi).toBeCloseTo(72, 9);
  });
  it('lists every limit, lowest first, with its source', () => {
    const { candidates } = ceiling([run('pvc-sdr26'), run('pe-sidr19', 1)], {
      parts: [{ name: 'filter', ratedPsi: 125 }],
      companyCapPsi: 60,
    });
    expect(candidates.map(({ kind, limitPsi }) => `${kind} ${limitPsi.toFixed(1)}`)).toEqual([
      'polyethylene 50.0',
      'pipe-rating 57.6',
      'company-cap 60.0',
      'rigid-pvc 80.0',
      'pipe-rating 115.2',
      'lowest-part 125.0',
    ]);
  });
  it('without a temperature it says that cold air was taken', () => {
    const { why } = ceiling([run('pvc-sch40')], { airTemperatureF: null });
    expect(why.missing).toEqual(['airTemperatureF']);
    expect(why.assumed.map((one) => one.why)).toContain('rated-for-cold-air');
  });
});

describe('what cannot be', () => {
  it('is named: caps, parts, runs, temperatures', () => {
    const base = { runs: [run('pvc-sch40')], parts: [], companyCapPsi: null, airTemperatureF: 60 };
    const field = (input: CeilingInput) => {
      const result = pressureCeiling(input);
      return !result.ok && result.error.kind === 'out-of-range' ? result.error.field : null;
    };
    expect(field({ ...base, companyCapPsi: 0 })).toBe('companyCapPsi');
    expect(field({ ...base, companyCapPsi: 300 })).toBe('companyCapPsi');
    expect(field({ ...base, parts: [{ name: 'valve', ratedPsi: -4 }] })).toBe('valve.ratedPsi');
    expect(field({ ...base, runs: [{ ...run('pvc-sch40'), lengthFt: -1 }] })).toBe('pvc-sch40-1.lengthFt');
    expect(field({ ...base, runs: [run('pvc-sdr26', 0.5)] })).toBe('pvc-sdr26-0.5.nominalIn');
    expect(field({ ...base, airTemperatureF: 2000 })).toBe('airTemperatureF');
  });
});

describe('laws of the ceiling', () => {
  const made = materials.flatMap((material) =>
    (material === 'unknown' ? [1] : nominalSizesIn(material)).map((nominalIn) => ({ material, nominalIn })),
  );
  const anyRun = fc
    .tuple(fc.constantFrom(...made), fc.option(fc.integer({ min: 40, max: 400 })))
    .map(([{ material, nominalIn }, ratedPsi]): PipeRun => run(material, nominalIn, ratedPsi));
  const anyInput: fc.Arbitrary<CeilingInput> = fc.record({
    runs: fc.array(anyRun, { maxLength: 5 }),
    parts: fc.array(
      fc.record({ name: fc.constantFrom('valve', 'filter'), ratedPsi: fc.integer({ min: 20, max: 300 }) }),
      {
        maxLength: 3,
      },
    ),
    policyId: fc.constantFrom(...(Object.keys(ceilingPolicies) as CeilingPolicyId[])),
    companyCapPsi: fc.option(fc.integer({ min: 10, max: 100 })),
    airTemperatureF: fc.option(fc.integer({ min: 0, max: 250 })),
  });

  it('never above any candidate, and one of them', () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const { pressurePsi, coldPressurePsi, candidates } = valueOf(pressureCeiling(input));
        return (
          candidates.every((one) => pressurePsi <= one.limitPsi && coldPressurePsi <= one.coldLimitPsi) &&
          candidates.some((one) => one.limitPsi === pressurePsi) &&
          pressurePsi <= coldPressurePsi
        );
      }),
    );
  });
  it('another part, a lower cap or hotter air never raises it', () => {
    fc.assert(
      fc.property(anyInput, anyRun, fc.integer({ min: 0, max: 100 }), (input, extra, hotter) => {
        const base = valueOf(pressureCeiling(input)).pressurePsi;
        const more = (change: Partial<CeilingInput>): number =>
          valueOf(pressureCeiling({ ...input, ...change })).pressurePsi;
        // A first run replaces the unknown path; from then on more pipe only adds limits.
        const longer = input.runs.length === 0 ? base : more({ runs: [...input.runs, extra] });
        const warmer =
          input.airTemperatureF === null ? base : more({ airTemperatureF: input.airTemperatureF + hotter });
        const capped = input.companyCapPsi === null ? base : more({ companyCapPsi: input.companyCapPsi / 2 });
        return longer <= base && warmer <= base && capped <= base;
      }),
    );
  });
});
