import { absolutePsi, galPerFt3, gaugePsi, seaLevelPsia } from '@rimeward/units';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { valueOf } from '../testing/fixtures';
import { waterPushed, type WaterPushedInput } from './water-pushed';

const base: WaterPushedInput = {
  flowGpm: 15,
  designPressurePsi: 40,
  elevationFt: 0,
  deliveredCfm: 110,
  regulatorPsi: gaugePsi(50),
};
const pushed = (change: Partial<WaterPushedInput> = {}) =>
  valueOf(waterPushed({ ...base, ...change }, seaLevelPsia));

describe('water in front of the air', () => {
  it('leaves as the heads pass it at the line pressure: 15 gpm x sqrt(50/40) (orifice equation, derived)', () => {
    expect(pushed()).toMatchObject({ limitedBy: 'heads', pressurePsi: 50 });
    expect(pushed().flowGpm).toBeCloseTo(15 * Math.sqrt(50 / 40), 9);
  });
  it('is no more than the air makes room for (Boyle, derived)', () => {
    const weak = pushed({ deliveredCfm: 3 });
    expect(weak.limitedBy).toBe('compressor');
    const room = (3 * galPerFt3 * seaLevelPsia) / (weak.pressurePsi + seaLevelPsia);
    expect(weak.flowGpm).toBeCloseTo(room, 6);
    expect(weak.flowGpm).toBeCloseTo(15 * Math.sqrt(weak.pressurePsi / 40), 4);
  });
  it('40 ft up take 17.3 psi, 80 ft 34.6 psi (62.4 lb/ft3, from memory)', () => {
    expect(pushed({ elevationFt: 40 }).liftPsi).toBeCloseTo(17.3, 1);
    expect(pushed({ elevationFt: 80 }).liftPsi).toBeCloseTo(34.67, 1);
  });
  it('stays where it is when the pressure cannot lift it', () => {
    expect(pushed({ elevationFt: 120 })).toMatchObject({ flowGpm: 0, limitedBy: 'lift' });
  });
  it('says what it took for missing figures', () => {
    const guess = pushed({ designPressurePsi: null, elevationFt: null });
    expect(guess.flowGpm).toBe(15);
    expect(guess.why.missing).toEqual(['designPressurePsi', 'elevationFt']);
    expect(guess.why.assumed.map(({ why }) => why)).toEqual(['heads-pass-design-flow', 'level-ground']);
    expect(pushed({ designPressurePsi: null }).why.missing).toEqual(['designPressurePsi']);
    expect(pushed({ elevationFt: null }).why.missing).toEqual(['elevationFt']);
  });
  it('grows with air and pressure and falls with height', () => {
    const figure = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(figure(1, 300), figure(5, 90), figure(0, 200), figure(1, 2), (air, psi, ft, more) => {
        const at = (deliveredCfm: number, regulator: number, elevationFt: number): number =>
          pushed({ deliveredCfm, regulatorPsi: gaugePsi(regulator), elevationFt }).flowGpm;
        const flow = at(air, psi, ft);
        return at(air * more, psi, ft) >= flow - 1e-6 && at(air, psi, ft * more) <= flow + 1e-6;
      }),
    );
  });
  it('refuses what cannot be, by name', () => {
    for (const [change, field] of [
      [{ flowGpm: -1 }, 'flowGpm'],
      [{ designPressurePsi: 0 }, 'designPressurePsi'],
      [{ elevationFt: 9000 }, 'elevationFt'],
      [{ deliveredCfm: 0 }, 'deliveredCfm'],
      [{ regulatorPsi: gaugePsi(0) }, 'regulatorPsi'],
    ] as const) {
      expect(waterPushed({ ...base, ...change }, seaLevelPsia)).toMatchObject({ error: { field } });
    }
    expect(waterPushed(base, absolutePsi(1))).toMatchObject({ error: { field: 'atmospherePsia' } });
  });
});
