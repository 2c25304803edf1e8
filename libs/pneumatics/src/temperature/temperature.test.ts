import { absolutePsi, gaugePsi, seaLevelPsia } from '@rimeward/units';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import fluids from '../../fixtures/fluids.json';
import type { Compressor } from '../air-demand/compressor';
import { kgSFromCfm } from '../air-demand/open-heads';
import { off, readCsv, valueOf } from '../testing/fixtures';
import { compressedF, dischargeTemperature } from './discharge';
import { hoseCooling } from './hose-cooling';
import { hottestWithoutLowering } from './wanted-temperature';

const towed: Compressor = { freeAirCfm: 185, maxPressurePsi: 100, stages: 1, aftercooler: false };

describe('compression', () => {
  for (const row of readCsv('discharge_temperature.csv')) {
    it(`${row.T_in_F} F to ${row.psig} psig: four ways (polytropic formula, published; table derived)`, () => {
      const outlet = (exponent: number, stages: 1 | 2 = 1): number =>
        compressedF(Number(row.T_in_F), gaugePsi(Number(row.psig)), seaLevelPsia, exponent, stages);
      expect(outlet(1.4)).toBeCloseTo(Number(row.T2_adiabatic_F), 1);
      expect(outlet(1.3)).toBeCloseTo(Number(row['T2_polytropic_n1.3_F']), 1);
      expect(outlet(1.25)).toBeCloseTo(Number(row['T2_polytropic_n1.25_F']), 1);
      expect(outlet(1.4, 2)).toBeCloseTo(Number(row.T2_two_stage_perfect_intercool_F), 1);
    });
  }
  it('70 F, 100 psig: 493 F (a calculator page with 14.7 psi, published)', () => {
    expect(compressedF(70, gaugePsi(100), absolutePsi(14.7))).toBeCloseTo(493, 0);
  });
  it(`24 points of ${fluids.version} (independent reference)`, () => {
    for (const { intakeK, ratio, exponent, outletK } of fluids.compression) {
      const intakeF = (intakeK * 9) / 5 - 459.67;
      const outletF = compressedF(intakeF, gaugePsi((ratio - 1) * seaLevelPsia), seaLevelPsia, exponent);
      expect(off(((outletF + 459.67) * 5) / 9, outletK)).toBeLessThan(1e-9);
    }
  });
});

describe('air as it leaves a compressor', () => {
  const leaving = (compressor: Compressor, airF: number | null = 60) =>
    dischargeTemperature(compressor, airF, gaugePsi(compressor.maxPressurePsi), seaLevelPsia);

  it('a towed machine without a word on cooling is taken for an oil-flooded screw, 220 F, and says so (from memory)', () => {
    const discharge = valueOf(leaving(towed));
    expect(discharge).toMatchObject({ basis: 'oil-flooded', leavingF: 220 });
    expect(discharge.why.assumed).toEqual([{ field: 'dischargeF', value: 220, why: 'oil-flooded-screw' }]);
    expect(discharge.dryF).toBeCloseTo(475.1, 1);
  });
  it('an aftercooler brings it to 20 F over ambient (from memory)', () => {
    expect(valueOf(leaving({ ...towed, aftercooler: true }))).toMatchObject({
      basis: 'aftercooler',
      leavingF: 80,
    });
  });
  it('a small machine is taken for dry compression, two stages cooler than one', () => {
    const small: Compressor = { ...towed, freeAirCfm: 18 };
    expect(valueOf(leaving(small))).toMatchObject({ basis: 'dry' });
    expect(valueOf(leaving({ ...small, stages: 2 })).leavingF).toBeCloseTo(237.3, 1);
  });
  it('a reading comes before every assumption', () => {
    const read = valueOf(leaving({ ...towed, aftercooler: true, measuredDischargeF: 151 }));
    expect(read).toMatchObject({ basis: 'measured', leavingF: 151 });
    expect(read.why.assumed).toEqual([]);
  });
  it('needs the air temperature, and refuses an impossible one', () => {
    expect(leaving(towed, null)).toEqual({
      ok: false,
      error: { kind: 'needs', fields: ['airTemperatureF'] },
    });
    expect(leaving(towed, 500)).toMatchObject({ error: { field: 'airTemperatureF' } });
  });
});

describe('cooling along a hose', () => {
  const at = (lengthFt: number, scfm: number, wantedF = 100) =>
    valueOf(
      hoseCooling({
        enteringF: 180,
        airTemperatureF: 60,
        hose: { insideDiameterIn: 0.75, lengthFt, couplings: 2, outsideDiameterIn: 1.16 },
        flowKgS: kgSFromCfm(scfm, 101_325, 294.26),
        wantedF,
        heatTransferWM2K: 10,
      }),
    );

  for (const [scfm, temperatures] of [
    [100, [166.0, 153.7, 133.1, 104.5]],
    [185, [172.2, 165.0, 151.8, 130.2]],
  ] as const) {
    it(`180 F in, 60 F around, ${scfm} scfm: 25 to 200 ft (U = 10 W/m2K assumed, derived)`, () => {
      [25, 50, 100, 200].forEach((lengthFt, index) => {
        expect(Math.abs(at(lengthFt, scfm).connectionF - (temperatures[index] ?? 0))).toBeLessThan(0.3);
      });
    });
  }
  it('names the hose that would be enough: at that length the air has the wanted temperature', () => {
    const enough = at(50, 100, 100).enoughFt ?? 0;
    expect(at(enough, 100, 100).connectionF).toBeCloseTo(100, 6);
    expect(at(50, 100, 200).enoughFt).toBe(0);
    expect(at(50, 100, 59).enoughFt).toBeNull();
  });
  it('says what it assumed', () => {
    const hose = { insideDiameterIn: 1, lengthFt: 50, couplings: 2 };
    const cooling = valueOf(
      hoseCooling({ enteringF: 180, airTemperatureF: 60, hose, flowKgS: 0.05, wantedF: 100 }),
    );
    expect(cooling.why.assumed.map(({ why }) => why)).toEqual(['heat-transfer', 'hose-wall']);
  });
  it('never cools below the air around, and cools more with length', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 800, noNaN: true }),
        fc.double({ min: 1, max: 2, noNaN: true }),
        (lengthFt, more) => {
          const short = at(lengthFt, 100).connectionF;
          const long = at(lengthFt * more, 100).connectionF;
          return long <= short + 1e-9 && long >= 60;
        },
      ),
    );
  });
});

describe('the air that a path can take', () => {
  it('80 psi in SDR 21 (200 psi) allow 105 F: factor 0.556 (PPI Recommendation C, second-hand)', () => {
    const run = { id: 'main', material: 'pvc-sdr21', nominalIn: 1, lengthFt: 10 } as const;
    const hottestF = hottestWithoutLowering([run], 80);
    expect(hottestF).toBeGreaterThan(100);
    expect(hottestF).toBeLessThan(110);
    expect(hottestWithoutLowering([run], 144)).toBe(73);
  });
  it('steel does not mind, polyethylene ends at 100 F (AWWA M55, published)', () => {
    expect(hottestWithoutLowering([{ id: 'a', material: 'galvanized', nominalIn: 1, lengthFt: 5 }], 80)).toBe(
      null,
    );
    expect(hottestWithoutLowering([{ id: 'a', material: 'pe-sidr7', nominalIn: 1, lengthFt: 5 }], 50)).toBe(
      100,
    );
  });
});
