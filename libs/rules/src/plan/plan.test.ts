import { foldVisit } from '@rimeward/field-log';
import { testId } from '@rimeward/field-log/testing';
import { written } from '@rimeward/field-log/testing/clean-visit';
import { testSystem, testZone } from '@rimeward/field-log/testing/systems';
import { describe, expect, it } from 'vitest';
import { plainCeiling } from '../facts/ceilings';
import { changed, clean, idsIn, system } from '../testing/judge';
import { planForSystem } from './plan-for-system';
import { judgedPlan, type PlanCircumstances } from './rule-plan';

const compressor = { freeAirCfm: 100, maxPressurePsi: 125, stages: 1 as const, aftercooler: true };
const hose = { insideDiameterIn: 1, lengthFt: 100, couplings: 2 };
const day: PlanCircumstances = {
  equipment: { compressor, hose },
  compressorName: 'Towed',
  conditions: { altitudeFt: 5_000, airTemperatureF: 45 },
  company: { pressureCapPsi: null },
};
const state = foldVisit(written(clean));
const [zoneOne = '', zoneTwo = ''] = system.zones.map((zone) => zone.id);

describe('plan of a system', () => {
  it('puts the higher and farther zone first, which clears the main line', () => {
    const plan = planForSystem(system, day.equipment, day.conditions, day.company);
    expect(plan.zones.map((zone) => [zone.zoneId, zone.clearsMain])).toEqual([
      [zoneTwo, true],
      [zoneOne, false],
    ]);
  });

  it('says what it needs, and still plans the rest', () => {
    const [zone] = planForSystem(system, { compressor: null, hose: null }, day.conditions, day.company).zones;
    expect(zone?.ceiling.ok).toBe(true);
    expect(zone?.fit).toMatchObject({ ok: false, error: { kind: 'needs' } });
  });
});

describe('plan that a visit is judged by', () => {
  it('counts the water of the main line in the zone that was in fact blown first', () => {
    const seconds = (of: typeof state) => judgedPlan(of, system, day).plan.airSecondsByZone;
    const reversed = foldVisit(written(changed('air-started', { zoneId: zoneTwo })));
    expect(Number(seconds(state)[zoneOne])).toBeGreaterThan(Number(seconds(reversed)[zoneOne]));
    expect(Number(seconds(state)[zoneTwo])).toBeLessThan(Number(seconds(reversed)[zoneTwo]));
  });

  it('agrees with the plain ceilings where no rating and no heat counts', () => {
    const mixed = testSystem({
      zones: [
        testZone(1),
        testZone(2, {
          laterals: [
            { id: 'pe', material: 'pe-sidr15', nominalIn: 1, lengthFt: 60, ratedPsi: 100, guessed: false },
          ],
        }),
      ],
    });
    for (const pressureCapPsi of [null, 45]) {
      const { ceilingByZone } = judgedPlan(state, mixed, { ...day, company: { pressureCapPsi } });
      for (const zone of mixed.zones) {
        expect(ceilingByZone[zone.id]).toEqual(plainCeiling(mixed, zone, pressureCapPsi));
      }
    }
  });

  it('lowers a ceiling for hot air that was measured, not for hot air that was estimated', () => {
    const hot = { ...day, conditions: { ...day.conditions, connectionTemperatureF: 110 } };
    const raw = { ...day, equipment: { compressor: { ...compressor, aftercooler: false }, hose } };
    const weak = testSystem({
      mainLine: [
        { id: 'main', material: 'pvc-sdr26', nominalIn: 1, lengthFt: 80, ratedPsi: 160, guessed: false },
      ],
    });
    // SDR 26: 160 psi at 73 F, factor 0.50 at 110 F (the lower of two published values), 0.72 where surge is not computed (USDA NRCS
    // Missouri handbook, 1997, citing ASAE S376.1): 57.6 psi.
    expect(judgedPlan(state, weak, hot).ceilingByZone[zoneOne]?.pressurePsi).toBeCloseTo(57.6, 6);
    expect(judgedPlan(state, weak, hot).ceilingByZone[zoneOne]?.setBy).toBe('pipe-rating');
    expect(judgedPlan(state, weak, raw).ceilingByZone[zoneOne]?.pressurePsi).toBe(80);
  });

  it('tells of a shop compressor, and is silent about one that fits', () => {
    const shop = { ...day, equipment: { compressor: { ...compressor, freeAirCfm: 5 }, hose } };
    expect(idsIn(clean, judgedPlan(state, system, shop))).toContain('compressor-too-small');
    expect(idsIn(clean, judgedPlan(state, system, day))).not.toContain('compressor-too-small');
  });

  it('finds nothing but the order in a clean visit that began with the near zone', () => {
    expect(idsIn(clean, judgedPlan(state, system, day))).toEqual(['order-against-plan']);
  });

  it('leaves figures out where the record lacks them', () => {
    const bare = testSystem({ zones: [testZone(1, { flowGpm: null, laterals: [] }), testZone(2)] });
    const { plan } = judgedPlan(state, bare, { ...day, equipment: { compressor: null, hose: null } });
    expect(plan.airSecondsByZone[testId(11)]).toBeNull();
    expect(plan.compressor).toBeUndefined();
    expect(idsIn(clean, { system: bare, plan })).not.toContain('air-against-water');
  });
});
