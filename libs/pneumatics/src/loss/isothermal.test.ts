import { absolutePsi, kelvinFromF, mPerFt, mPerIn, paPerPsi, seaLevelPsia } from '@rimeward/units';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import fluids from '../../fixtures/fluids.json';
import { kgSFromCfm } from '../air-demand/open-heads';
import { off, readCsv, sizeFromText } from '../testing/fixtures';
import { darcyFrictionFactor } from './friction-factor';
import { harrisLossPsi, harrisOutletPsia } from './harris';
import {
  isothermalInletPa,
  isothermalLimitMach,
  isothermalOutletPa,
  machNumber,
  type Bore,
} from './isothermal';

const warmK = kelvinFromF(70);
const bore = (insideIn: number, lengthFt: number, roughnessM: number): Bore => ({
  diameterM: insideIn * mPerIn,
  lengthM: lengthFt * mPerFt,
  roughnessM,
  frictionMultiple: 1,
});
const flow = (scfm: number): number => kgSFromCfm(scfm, 101_325, warmK);
const inletPa = (psig: number): number => (psig + seaLevelPsia) * paPerPsi;
const lossPsi = (pipe: Bore, scfm: number, psig: number): number => {
  const outletPa = isothermalOutletPa(pipe, flow(scfm), inletPa(psig), warmK);
  return outletPa === null ? NaN : (inletPa(psig) - outletPa) / paPerPsi;
};
const schedule40In: Record<string, number> = { '1/2': 0.622, '3/4': 0.824, '1': 1.049 };

describe('friction factor', () => {
  it(`agrees with Colebrook's equation at 28 points (C. F. Colebrook 1939, ${fluids.version}, independent reference)`, () => {
    for (const { reynolds, relativeRoughness, darcy } of fluids.colebrook) {
      expect(off(darcyFrictionFactor(reynolds, relativeRoughness), darcy)).toBeLessThan(1e-6);
    }
  });
  it('is 64 / Re in laminar flow (published)', () => {
    expect(darcyFrictionFactor(1000, 1e-4)).toBeCloseTo(0.064, 12);
  });
});

describe('isothermal loss', () => {
  for (const { insideDiameterIn, cfm, psig, lengthFt, outletPa } of fluids.isothermal) {
    it(`${cfm} ft3/min through ${lengthFt} ft of ${insideDiameterIn} in from ${psig} psig (${fluids.version}, independent reference)`, () => {
      const ours = isothermalOutletPa(
        bore(insideDiameterIn, lengthFt, 1.5e-6),
        flow(cfm),
        inletPa(psig),
        warmK,
      );
      if (outletPa === null) expect(ours).toBeNull();
      else expect(off(ours ?? 0, outletPa)).toBeLessThan(1e-3);
    });
  }
  for (const row of readCsv('air_loss_steel_sch40.csv')) {
    it(`steel ${row.nominal_in} in, ${row.scfm} ft3/min, ${row.psig} psig: ${row.psi_per_100ft_table} psi in 100 ft (steel air loss table, published)`, () => {
      const pipe = bore(schedule40In[row.nominal_in ?? ''] ?? 0, 100, 4.5e-5);
      const loss = lossPsi(pipe, Number(row.scfm), Number(row.psig));
      expect(Number.isFinite(sizeFromText(row.nominal_in ?? ''))).toBe(true);
      const table = Number(row.psi_per_100ft_table);
      if (table >= 0.1) expect(off(loss, table)).toBeLessThan(0.1);
      expect(off(loss, Number(row['psi_isothermal_darcy_0.045mm']))).toBeLessThan(0.02);
    });
  }
  it('meets the five best rows of the steel table within 3 % (steel air loss table, published)', () => {
    for (const [size, scfm, psig, table] of [
      ['3/4', 50, 80, 2.4],
      ['1/2', 50, 80, 10.5],
      ['1', 100, 80, 2.7],
      ['1', 200, 80, 10.9],
      ['1', 200, 125, 7.1],
    ] as const) {
      expect(off(lossPsi(bore(schedule40In[size] ?? 0, 100, 4.5e-5), scfm, psig), table)).toBeLessThan(0.03);
    }
  });
  for (const row of readCsv('hose_loss_python3_fluids.csv')) {
    it(`hose ${row.hose_id_in} in, ${row.length_ft} ft, ${row.scfm} scfm, ${row.P1_psig} psig: ${row.dP_psi_isothermal} psi (python3-fluids, independent reference)`, () => {
      const loss = lossPsi(
        bore(Number(row.hose_id_in), Number(row.length_ft), 1.5e-6),
        Number(row.scfm),
        Number(row.P1_psig),
      );
      expect(off(loss, Number(row.dP_psi_isothermal))).toBeLessThan(0.01);
    });
  }
  it('3/4 in, 50 ft, 30 scfm, 90 psi: 0.489 psi by formula, about 0.4 in the chart (engineeringtoolbox d_1536, published)', () => {
    const loss = lossPsi(bore(0.75, 50, 1.5e-6), 30, 90);
    expect(loss).toBeCloseTo(0.489, 2);
    expect(Math.abs(loss - 0.4)).toBeLessThan(0.1);
  });
  it('the flow chokes where the isothermal limit says, Mach 0.845 (python3-fluids, independent reference)', () => {
    expect(isothermalLimitMach).toBeCloseTo(0.845, 3);
    const pipe = bore(0.5, 100, 1.5e-6);
    // The most that passes: just below it an answer exists, just above it none.
    let [low, high] = [0, 1];
    while (high - low > 1e-9) {
      const middle = (low + high) / 2;
      if (isothermalOutletPa(pipe, middle, 5e5, 290) === null) high = middle;
      else low = middle;
    }
    const outletPa = isothermalOutletPa(pipe, low, 5e5, 290) ?? 0;
    expect(machNumber(pipe, low, outletPa, 290)).toBeCloseTo(isothermalLimitMach, 2);
  });
  for (const { inletPa: from, frictionNumber, outletPa } of fluids.isothermalLimits) {
    it(`choked outlet of f L/D ${frictionNumber} from ${from} Pa (${fluids.version}, independent reference)`, () => {
      // The limit in closed form: (P1/P2)^2 = 1 + f L/D + 2 ln(P1/P2).
      const ratio = from / outletPa;
      expect(off(ratio * ratio, 1 + frictionNumber + 2 * Math.log(ratio))).toBeLessThan(1e-6);
    });
  }
});

describe('isothermal laws', () => {
  const anyBore = fc.record({
    insideIn: fc.double({ min: 0.3, max: 3, noNaN: true }),
    lengthFt: fc.double({ min: 1, max: 500, noNaN: true }),
    scfm: fc.double({ min: 0.5, max: 300, noNaN: true }),
    psig: fc.double({ min: 5, max: 120, noNaN: true }),
  });
  it('inlet and outlet are inverse to each other', () => {
    fc.assert(
      fc.property(anyBore, ({ insideIn, lengthFt, scfm, psig }) => {
        const pipe = bore(insideIn, lengthFt, 1.5e-6);
        const outletPa = isothermalOutletPa(pipe, flow(scfm), inletPa(psig), warmK);
        if (outletPa === null) return true;
        return off(isothermalInletPa(pipe, flow(scfm), outletPa, warmK), inletPa(psig)) < 1e-6;
      }),
    );
  });
  it('longer hose, more air, or less pressure never lose less', () => {
    fc.assert(
      fc.property(
        anyBore,
        fc.double({ min: 1, max: 2, noNaN: true }),
        ({ insideIn, lengthFt, scfm, psig }, more) => {
          const loss = (length: number, air: number, from: number): number => {
            const value = lossPsi(bore(insideIn, length, 1.5e-6), air, from);
            return Number.isNaN(value) ? Infinity : value;
          };
          const base = loss(lengthFt, scfm, psig);
          if (base === Infinity) return true;
          const slack = 1e-6 + 1e-6 * base;
          return (
            loss(lengthFt * more, scfm, psig) >= base - slack &&
            loss(lengthFt, scfm * more, psig) >= base - slack &&
            loss(lengthFt, scfm, psig / more) >= base - slack
          );
        },
      ),
    );
  });
});

describe('Harris', () => {
  it('100 scfm, 1.049 in, 100 ft, 80 psig: 3.427 psi, closed form 3.506 (engineersedge, published)', () => {
    const from = absolutePsi(94.6959);
    expect(harrisLossPsi(100, 1.049, 100, from)).toBeCloseTo(3.427, 2);
    expect(94.6959 - (harrisOutletPsia(100, 1.049, 100, from) ?? 0)).toBeCloseTo(3.506, 2);
  });
  it('is the conservative one: higher than the steel table on every row at or above 0.1 psi (published)', () => {
    for (const row of readCsv('air_loss_steel_sch40.csv')) {
      const table = Number(row.psi_per_100ft_table);
      const from = absolutePsi(Number(row.psig) + seaLevelPsia);
      const harris = harrisLossPsi(Number(row.scfm), schedule40In[row.nominal_in ?? ''] ?? 0, 100, from);
      expect(off(harris, Number(row.psi_harris_inlet_P))).toBeLessThan(0.015);
      if (table >= 0.1) expect(harris).toBeGreaterThan(table);
    }
  });
  it('leaves nothing where the hose is far too small', () => {
    expect(harrisOutletPsia(185, 0.375, 100, absolutePsi(64.7))).toBeNull();
  });
});
