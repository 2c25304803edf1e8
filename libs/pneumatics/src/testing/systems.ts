import fc from 'fast-check';
import { headKinds } from '../cycles/head-kind';
import { materials } from '../pipe/material';
import type { PipeRun } from '../pipe/pipe-run';
import type { PlanInput, ZoneInput } from '../plan/plan-input';

/** A zone of which everything is known. */
export const sampleZone: ZoneInput = {
  id: 'zone-1',
  number: 1,
  headKind: 'rotor',
  flowGpm: 15,
  designPressurePsi: 40,
  elevationFt: 6,
  distanceFt: 240,
  laterals: [{ id: 'lateral', material: 'pvc-sdr26', nominalIn: 1, lengthFt: 120, ratedPsi: null }],
  lowestRatedPart: { name: 'valve', ratedPsi: 125 },
};

/** A system of three zones, a towed compressor with an aftercooler, a hose, a site a mile high. */
export const sampleInput: PlanInput = {
  system: {
    mainLine: [{ id: 'main', material: 'pvc-sch40', nominalIn: 1.25, lengthFt: 150, ratedPsi: null }],
    parts: [{ name: 'filter', ratedPsi: 150 }],
    zones: [
      sampleZone,
      { ...sampleZone, id: 'zone-2', number: 2, headKind: 'spray', elevationFt: 14, distanceFt: 300 },
      {
        ...sampleZone,
        id: 'zone-3',
        number: 3,
        headKind: 'drip',
        flowGpm: 4,
        elevationFt: 0,
        distanceFt: 40,
      },
    ],
  },
  equipment: {
    compressor: { freeAirCfm: 110, maxPressurePsi: 100, stages: 1, aftercooler: true },
    hose: { insideDiameterIn: 0.75, lengthFt: 100, couplings: 3 },
  },
  conditions: { altitudeFt: 5280, airTemperatureF: 45 },
  company: { pressureCapPsi: null },
};

const anyRun: fc.Arbitrary<PipeRun> = fc.record({
  id: fc.uuid(),
  material: fc.constantFrom(...materials),
  nominalIn: fc.constantFrom(0.5, 0.75, 1, 1.25, 1.5, 2, 2.5, 3, 4, 5),
  lengthFt: fc.integer({ min: -1, max: 900 }),
  ratedPsi: fc.option(fc.integer({ min: 40, max: 400 })),
});

const anyPart = fc.record({
  name: fc.constantFrom('valve', 'filter'),
  ratedPsi: fc.integer({ min: 20, max: 250 }),
});

const anyZone: fc.Arbitrary<ZoneInput> = fc.record({
  id: fc.uuid(),
  number: fc.integer({ min: 1, max: 60 }),
  headKind: fc.constantFrom(...headKinds),
  flowGpm: fc.option(fc.double({ min: 0, max: 80, noNaN: true })),
  designPressurePsi: fc.option(fc.double({ min: 0, max: 120, noNaN: true })),
  elevationFt: fc.option(fc.integer({ min: -60, max: 200 })),
  distanceFt: fc.option(fc.integer({ min: 0, max: 1500 })),
  laterals: fc.array(anyRun, { maxLength: 3 }),
  lowestRatedPart: fc.option(anyPart),
});

/** Any system that a record may hold, wise or not: unknown pipe, missing figures, sizes that nobody makes. */
export const anyPlanInput: fc.Arbitrary<PlanInput> = fc.record({
  system: fc.record({
    mainLine: fc.array(anyRun, { maxLength: 2 }),
    parts: fc.array(anyPart, { maxLength: 2 }),
    zones: fc.array(anyZone, { maxLength: 4 }),
  }),
  equipment: fc.record({
    compressor: fc.option(
      fc.record({
        freeAirCfm: fc.integer({ min: 0, max: 400 }),
        maxPressurePsi: fc.integer({ min: 80, max: 175 }),
        stages: fc.constantFrom(1, 2),
        aftercooler: fc.boolean(),
      }),
    ),
    hose: fc.option(
      fc.record({
        insideDiameterIn: fc.constantFrom(0.25, 0.375, 0.5, 0.75, 1, 1.25),
        lengthFt: fc.integer({ min: 0, max: 300 }),
        couplings: fc.integer({ min: 0, max: 6 }),
      }),
    ),
  }),
  conditions: fc.record({
    altitudeFt: fc.option(fc.integer({ min: -300, max: 11_000 })),
    airTemperatureF: fc.option(fc.integer({ min: -20, max: 95 })),
  }),
  company: fc.record({ pressureCapPsi: fc.option(fc.integer({ min: 20, max: 90 })) }),
});
