import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import fluids from '../../fixtures/fluids.json';
import { off, readCsv, valueOf } from '../testing/fixtures';
import { airViscosityPaS, psiPerFtOfWater, waterDensityKgM3 } from './air';
import { standardAtmosphere } from './standard-atmosphere';

describe('standard atmosphere', () => {
  for (const row of readCsv('atmosphere_1976.csv')) {
    it(`${row.alt_ft} ft: ${row.P_psia} psia, ${row.T_F} F (US Standard Atmosphere 1976, published)`, () => {
      const air = valueOf(standardAtmosphere(Number(row.alt_ft)));
      expect(air.pressurePa).toBeCloseTo(Number(row.P_Pa), 0);
      expect(Math.abs(air.pressurePsia - Number(row.P_psia))).toBeLessThan(1e-4);
      expect(Math.abs(air.pressureRatio - Number(row.ratio_to_SL))).toBeLessThan(1e-5);
      expect(Math.abs(air.temperatureF - Number(row.T_F))).toBeLessThan(0.006);
      expect(off(air.densityKgM3, Number(row.rho_kg_m3))).toBeLessThan(1e-4);
    });
  }
  for (const row of fluids.atmosphere) {
    it(`${row.altitudeFt} ft agrees with ${fluids.version} (independent reference)`, () => {
      const air = valueOf(standardAtmosphere(row.altitudeFt));
      expect(off(air.pressurePa, row.pressurePa)).toBeLessThan(2e-6);
      expect(off(air.densityKgM3, row.densityKgM3)).toBeLessThan(2e-5);
      expect(off(airViscosityPaS(row.temperatureK), row.viscosityPaS)).toBeLessThan(1e-3);
    });
  }
  it('falls with altitude', () => {
    const altitude = fc.double({ min: -1500, max: 15000, noNaN: true });
    fc.assert(
      fc.property(altitude, altitude, (a, b) => {
        const high = valueOf(standardAtmosphere(Math.max(a, b))).pressurePsia;
        return high <= valueOf(standardAtmosphere(Math.min(a, b))).pressurePsia;
      }),
    );
  });
  it('refuses what lies outside its layer, and what is no number', () => {
    for (const altitudeFt of [-1501, 15_001, Number.NaN]) {
      expect(standardAtmosphere(altitudeFt)).toEqual({
        ok: false,
        error: { kind: 'out-of-range', field: 'altitudeFt', range: '-1500 to 15000' },
      });
    }
  });
});

describe('water', () => {
  it('0.4333 psi a foot, 2.3077 ft a psi (62.4 lb/ft3, from memory)', () => {
    expect(psiPerFtOfWater).toBeCloseTo(0.4333, 4);
    expect(1 / psiPerFtOfWater).toBeCloseTo(2.3077, 4);
  });
  it('within 0.05 % of the foot of water at 4 C (GNU units, published)', () => {
    expect(off(psiPerFtOfWater, 0.4335275)).toBeLessThan(5e-4);
    expect(waterDensityKgM3).toBeCloseTo(999.55, 2);
  });
});
