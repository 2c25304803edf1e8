import fc from 'fast-check';
import { describe, expect, expectTypeOf, it } from 'vitest';
import { absolutePsi, gaugePsi, seaLevelPsia, toAbsolute, toGauge } from './pressure';
import type { AbsolutePsi, GaugePsi } from './pressure';
import { fFromKelvin, kelvinFromF, rankineFromF } from './temperature';

describe('gauge and absolute pressure', () => {
  it('differ by the air around: 50 psi gauge at sea level are 64.696 psi absolute', () => {
    expect(toAbsolute(gaugePsi(50), seaLevelPsia)).toBeCloseTo(64.6959, 4);
  });
  it('go there and back', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -14, max: 300, noNaN: true }),
        fc.double({ min: 8, max: 15, noNaN: true }),
        (p, a) => {
          const back = toGauge(toAbsolute(gaugePsi(p), absolutePsi(a)), absolutePsi(a));
          return Math.abs(back - p) < 1e-9;
        },
      ),
    );
  });
  it('cannot be taken for each other by the compiler', () => {
    expectTypeOf<GaugePsi>().not.toExtend<AbsolutePsi>();
    expectTypeOf<AbsolutePsi>().not.toExtend<GaugePsi>();
    expectTypeOf<number>().not.toExtend<GaugePsi>();
  });
});

describe('temperature', () => {
  it('70 F are 529.67 degrees Rankine, 530 as the orifice formulas round it (engineersedge, published)', () => {
    expect(rankineFromF(70)).toBeCloseTo(529.67, 6);
  });
  it('59 F are 288.15 K (US Standard Atmosphere 1976, published)', () => {
    expect(kelvinFromF(59)).toBeCloseTo(288.15, 6);
  });
  it('goes there and back', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -400, max: 2000, noNaN: true }),
        (f) => Math.abs(fFromKelvin(kelvinFromF(f)) - f) < 1e-9,
      ),
    );
  });
});
