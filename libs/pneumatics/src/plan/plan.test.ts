import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formulas } from '../explain/formulas';
import { sources } from '../explain/sources';
import { anyPlanInput, sampleInput, sampleZone } from '../testing/systems';
import { valueOf } from '../testing/fixtures';
import type { PlanInput } from './plan-input';
import { planSystem } from './plan-system';
import { planZone } from './plan-zone';
import type { ZonePlan } from './zone-plan';

const figures = (plan: ZonePlan) =>
  (Object.keys(plan) as (keyof ZonePlan)[]).flatMap((name) => {
    const figure = plan[name];
    return typeof figure === 'object' ? [[name, figure] as const] : [];
  });

describe('the plan of a zone', () => {
  const plan = planZone(sampleInput, sampleZone, true);

  it('has every figure when nothing is missing', () => {
    expect(figures(plan).filter(([, figure]) => !figure.ok)).toEqual([]);
    expect(figures(plan)).toHaveLength(12);
  });
  it('carries inputs, formula and sources with every figure', () => {
    for (const [name, figure] of figures(plan)) {
      if (!figure.ok) continue;
      const { why } = figure.value;
      expect(Object.keys(why.inputs).length, name).toBeGreaterThan(0);
      expect(formulas[why.formulaId].sourceIds).toEqual(why.sourceIds);
      expect(why.sourceIds.every((id) => id in sources)).toBe(true);
    }
  });
  it('works at the ceiling: displacement, held pressure and energy use its pressure', () => {
    const { pressurePsi } = valueOf(plan.ceiling);
    expect(valueOf(plan.displacement).why.inputs.linePsi).toBe(pressurePsi);
    expect(valueOf(plan.held).gaugePsi).toBeLessThanOrEqual(pressurePsi);
    expect(valueOf(plan.energy).why.inputs.pressurePsi).toBe(pressurePsi);
  });
  it('the first zone clears the main too; the energy is that of the whole path for all', () => {
    const later = planZone(sampleInput, sampleZone, false);
    expect(valueOf(plan.water).runs.map(({ runId }) => runId)).toEqual(['main', 'lateral']);
    expect(valueOf(later.water).runs.map(({ runId }) => runId)).toEqual(['lateral']);
    expect(valueOf(later.energy).volumeGal).toBe(valueOf(plan.energy).volumeGal);
    expect(valueOf(later.cycles).leastSeconds).toBeLessThan(valueOf(plan.cycles).leastSeconds);
  });
  it('a reading at the connection comes before the estimate', () => {
    const at = (connectionTemperatureF: number) =>
      planZone(
        { ...sampleInput, conditions: { ...sampleInput.conditions, connectionTemperatureF } },
        sampleZone,
        true,
      );
    expect(valueOf(at(60).ceiling).why.inputs.airTemperatureF).toBe(60);
    expect(valueOf(at(150).ceiling).pressurePsi).toBe(0);
  });
  it('where the air is too hot for any pressure the other figures are for air that has been cooled', () => {
    const hot = planZone(
      { ...sampleInput, conditions: { ...sampleInput.conditions, connectionTemperatureF: 150 } },
      sampleZone,
      true,
    );
    const { coldPressurePsi } = valueOf(hot.ceiling);
    expect(coldPressurePsi).toBeGreaterThan(0);
    expect(valueOf(hot.displacement).why.inputs.linePsi).toBe(coldPressurePsi);
  });
});

describe('what is missing is named, and the rest is there', () => {
  const without = (change: Partial<PlanInput>, zone = sampleZone) =>
    planZone({ ...sampleInput, ...change }, zone, true);
  const missing = (plan: ZonePlan): Record<string, string[]> =>
    Object.fromEntries(
      figures(plan).flatMap(([name, figure]) =>
        !figure.ok && figure.error.kind === 'needs' ? [[name, figure.error.fields]] : [],
      ),
    );

  it('altitude', () => {
    const plan = without({ conditions: { altitudeFt: null, airTemperatureF: 45 } });
    expect(missing(plan).displacement).toEqual(['altitudeFt']);
    expect(plan.ceiling.ok && plan.water.ok).toBe(true);
  });
  it('compressor, hose', () => {
    expect(
      missing(without({ equipment: { compressor: null, hose: sampleInput.equipment.hose } })).held,
    ).toEqual(['compressor']);
    const noHose = missing(
      without({ equipment: { compressor: sampleInput.equipment.compressor, hose: null } }),
    );
    expect(noHose).toEqual({ held: ['hose'], hoseLoss: ['hose'], cooling: ['hose'] });
  });
  it('flow and design pressure of the zone', () => {
    const plan = without({}, { ...sampleZone, flowGpm: null, designPressurePsi: null });
    expect(missing(plan)).toMatchObject({
      displacement: ['flowGpm'],
      openHeads: ['flowGpm', 'designPressurePsi'],
      cycles: ['flowGpm'],
      fit: ['flowGpm'],
    });
    expect(missing(without({}, { ...sampleZone, designPressurePsi: null })).openHeads).toEqual([
      'designPressurePsi',
    ]);
    expect(missing(without({}, { ...sampleZone, flowGpm: null })).openHeads).toEqual(['flowGpm']);
  });
  it('air temperature: the ceiling says so and is for cold air', () => {
    const plan = without({ conditions: { altitudeFt: 5280, airTemperatureF: null } });
    expect(missing(plan)).toEqual({ discharge: ['airTemperatureF'], cooling: ['airTemperatureF'] });
    expect(valueOf(plan.ceiling).why.missing).toEqual(['airTemperatureF']);
  });
  it('material of a run', () => {
    const plan = without(
      {},
      { ...sampleZone, laterals: [{ id: 'lateral', material: 'unknown', nominalIn: 1, lengthFt: 50 }] },
    );
    expect(missing(plan).water).toEqual(['lateral.material']);
    expect(valueOf(plan.ceiling).setBy).toBe('unknown');
  });
  it('a rating read on the hose counts, as a part', () => {
    const hose = { insideDiameterIn: 0.75, lengthFt: 50, couplings: 2, ratedPsi: 30 };
    const plan = without({ equipment: { ...sampleInput.equipment, hose } });
    expect(valueOf(plan.ceiling)).toMatchObject({ pressurePsi: 30, setBy: 'lowest-part' });
    expect(valueOf(plan.ceiling).candidates[0]?.subject).toBe('hose');
  });
  it('impossible equipment is named', () => {
    const compressor = { freeAirCfm: -5, maxPressurePsi: 100, stages: 1, aftercooler: false } as const;
    const plan = without({ equipment: { compressor, hose: sampleInput.equipment.hose } });
    expect(plan.fit).toMatchObject({ error: { field: 'compressor.freeAirCfm' } });
    const hose = { insideDiameterIn: -1, lengthFt: 50, couplings: 2 };
    expect(without({ equipment: { ...sampleInput.equipment, hose } }).held).toMatchObject({
      error: { field: 'hose.insideDiameterIn' },
    });
    expect(without({ conditions: { altitudeFt: 90_000, airTemperatureF: 45 } }).displacement).toMatchObject({
      error: { field: 'altitudeFt' },
    });
  });
});

describe('the plan of a system', () => {
  it('puts zones in order; only the first clears the main', () => {
    const { zones, order, delivery } = planSystem(sampleInput);
    expect(zones.map(({ zoneId }) => zoneId)).toEqual(valueOf(order).places.map(({ zoneId }) => zoneId));
    expect(zones.map(({ clearsMain }) => clearsMain)).toEqual([true, false, false]);
    expect(valueOf(delivery).freeAirCfm).toBe(110);
  });
  it('carries the cautions of every air figure', () => {
    expect(planSystem(sampleInput).cautions).toContain('pvc-is-no-air-line');
    expect(planSystem(sampleInput).cautions).toContain('never-close-the-last-outlet');
  });
  it('keeps the given order when there is none to propose', () => {
    const doubled = { ...sampleInput.system, zones: [sampleZone, sampleZone] };
    const { order, zones } = planSystem({ ...sampleInput, system: doubled });
    expect(order.ok).toBe(false);
    expect(zones).toHaveLength(2);
  });
  it('is plain data: it survives being stored and sent', () => {
    const plan = planSystem(sampleInput);
    expect(JSON.parse(JSON.stringify(plan))).toEqual(plan);
  });
});

describe('laws of a plan, for any system', () => {
  it('is the same each time, leaves its input alone, and every number in it is finite', () => {
    fc.assert(
      fc.property(anyPlanInput, (input) => {
        const before = JSON.stringify(input);
        const plan = planSystem(input);
        expect(planSystem(input)).toEqual(plan);
        expect(JSON.stringify(input)).toBe(before);
        expect(JSON.stringify(plan)).not.toMatch(/NaN/);
        for (const zone of plan.zones) {
          for (const [name, figure] of figures(zone)) {
            if (figure.ok)
              expect(allFinite(figure.value), `${name}: ${JSON.stringify(figure.value)}`).toBe(true);
          }
        }
      }),
    );
  });
  it('altitude never makes a compressor hold more, nor displacement cheaper', () => {
    fc.assert(
      fc.property(
        anyPlanInput,
        fc.integer({ min: 0, max: 5000 }),
        fc.integer({ min: 1, max: 5000 }),
        (input, low, up) => {
          const at = (altitudeFt: number) =>
            planSystem({
              ...input,
              conditions: { ...input.conditions, altitudeFt, connectionTemperatureF: 60 },
            }).zones;
          const [lower, higher] = [at(low), at(low + up)];
          lower.forEach((zone, index) => {
            const other = higher[index];
            if (!other) throw new Error('the altitude changed the number of zones');
            if (zone.displacement.ok && other.displacement.ok) {
              expect(other.displacement.value.freeAirCfm).toBeGreaterThanOrEqual(
                zone.displacement.value.freeAirCfm - 1e-9,
              );
            }
            if (zone.energy.ok && other.energy.ok) {
              expect(other.energy.value.energyJ).toBeGreaterThanOrEqual(zone.energy.value.energyJ - 1e-6);
            }
          });
        },
      ),
    );
  });
});

function allFinite(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (Array.isArray(value)) return value.every(allFinite);
  return typeof value === 'object' && value !== null ? Object.values(value).every(allFinite) : true;
}
