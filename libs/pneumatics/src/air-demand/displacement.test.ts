import { absolutePsi, gaugePsi } from '@rimeward/units';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { valueOf } from '../testing/fixtures';
import { compressorDelivery } from './delivery';
import { displacementAir } from './displacement';

const seaLevel = absolutePsi(14.6959);
const at5000Ft = absolutePsi(12.2283);
const at7000Ft = absolutePsi(11.3408);

describe('air to displace water', () => {
  for (const [gpm, rule, exact, sea50, high50, sea80, high40] of [
    [10, 1.3333, 1.3368, 5.885, 6.803, 8.614, 6.052],
    [15, 2.0, 2.0052, 8.828, 10.204, 12.921, 9.078],
    [20, 2.6667, 2.6736, 11.77, 13.606, 17.228, 12.104],
    [50, 6.6667, 6.684, 29.425, 34.014, 43.07, 30.259],
  ] as const) {
    it(`${gpm} gpm: rule ${rule} (Colorado State University Extension, second-hand), exact ${exact} ft3/min (GNU units, published)`, () => {
      const air = valueOf(displacementAir(gpm, gaugePsi(50), seaLevel));
      expect(air.ruleCfm).toBeCloseTo(rule, 4);
      expect(air.exactCfm).toBeCloseTo(exact, 4);
    });
    it(`${gpm} gpm: free air at three altitudes and pressures (Boyle, derived)`, () => {
      const free = (psi: number, atmosphere: typeof seaLevel): number =>
        valueOf(displacementAir(gpm, gaugePsi(psi), atmosphere)).freeAirCfm;
      expect(Math.abs(free(50, seaLevel) - sea50)).toBeLessThan(0.01);
      expect(Math.abs(free(50, at5000Ft) - high50)).toBeLessThan(0.01);
      expect(Math.abs(free(80, seaLevel) - sea80)).toBeLessThan(0.01);
      expect(Math.abs(free(40, at7000Ft) - high40)).toBeLessThan(0.01);
    });
  }
  it('grows with flow, pressure and altitude', () => {
    const flow = fc.double({ min: 0.1, max: 1000, noNaN: true });
    const psi = fc.double({ min: 0, max: 100, noNaN: true });
    const air = fc.double({ min: 9, max: 14.7, noNaN: true });
    fc.assert(
      fc.property(flow, flow, psi, psi, air, air, (f1, f2, p1, p2, a1, a2) => {
        const free = (f: number, p: number, a: number): number =>
          valueOf(displacementAir(f, gaugePsi(p), absolutePsi(a))).freeAirCfm;
        const least = free(Math.min(f1, f2), Math.min(p1, p2), Math.max(a1, a2));
        return free(Math.max(f1, f2), Math.max(p1, p2), Math.min(a1, a2)) >= least - 1e-9;
      }),
    );
  });
  it('refuses no flow, vacuum and a wrong atmosphere, by name', () => {
    expect(displacementAir(0, gaugePsi(50), seaLevel)).toMatchObject({ error: { field: 'flowGpm' } });
    expect(displacementAir(10, gaugePsi(-1), seaLevel)).toMatchObject({ error: { field: 'linePsi' } });
    expect(displacementAir(10, gaugePsi(50), absolutePsi(30))).toMatchObject({
      error: { field: 'atmospherePsia' },
    });
  });
});

describe('delivery of a compressor', () => {
  it('keeps its volume and loses mass: 0.8321 at 5000 ft (US Standard Atmosphere 1976, published)', () => {
    const delivery = valueOf(compressorDelivery(185, 5000));
    expect(delivery.freeAirCfm).toBe(185);
    expect(delivery.pressureRatio).toBeCloseTo(0.8321, 4);
    expect(delivery.standardAirCfm).toBeCloseTo(185 * 0.83209, 2);
  });
  it('shows what the engine loses, 3 % each 1000 ft, and none below sea level (from memory)', () => {
    expect(valueOf(compressorDelivery(185, 5000)).engineLossPercent).toBeCloseTo(15, 9);
    expect(valueOf(compressorDelivery(185, -500)).engineLossPercent).toBe(0);
  });
  it('refuses a compressor without delivery and a mountain out of range', () => {
    expect(compressorDelivery(0, 0)).toMatchObject({ error: { field: 'freeAirCfm' } });
    expect(compressorDelivery(100, 30_000)).toMatchObject({ error: { field: 'altitudeFt' } });
  });
});
