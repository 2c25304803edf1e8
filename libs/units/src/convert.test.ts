import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import gnu from '../fixtures/gnu-units.json';
import { fromCompanyUnit, toCompanyUnit, type FigureKind, type UnitChoice } from './company-units';
import { convert } from './convert';

const valueOf = (result: ReturnType<typeof convert>): number => {
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};

describe(`conversion on js-quantities agrees with ${gnu.version} (independent reference)`, () => {
  for (const { from, to, value } of gnu.factors) {
    it(`${from} to ${to} within one part in a million`, () => {
      expect(Math.abs(valueOf(convert(1, from, to)) / value - 1)).toBeLessThan(1e-6);
    });
  }
  for (const { temperatureF, temperatureC } of gnu.celsius) {
    it(`${temperatureF} F is ${temperatureC.toFixed(2)} C`, () => {
      expect(valueOf(convert(temperatureF, 'tempF', 'tempC'))).toBeCloseTo(temperatureC, 9);
    });
  }
});

describe('what cannot be converted is refused', () => {
  it('names the unit that is not known', () => {
    expect(convert(1, 'furlongs-of-air', 'psi')).toMatchObject({ ok: false, error: { field: 'unit' } });
  });
  it('refuses a pressure as a length', () => {
    expect(convert(1, 'psi', 'foot')).toMatchObject({ ok: false, error: { kind: 'out-of-range' } });
  });
  it('refuses a temperature below absolute zero and what is no number', () => {
    expect(convert(-500, 'tempF', 'tempC').ok).toBe(false);
    expect(convert(Number.NaN, 'psi', 'kPa')).toMatchObject({ error: { field: 'value' } });
  });
});

const kinds: FigureKind[] = [
  'pressure',
  'freeAir',
  'waterFlow',
  'volume',
  'length',
  'diameter',
  'temperature',
];
const choices: UnitChoice[] = [
  { units: 'us', metricPressure: 'kPa' },
  { units: 'metric', metricPressure: 'kPa' },
  { units: 'metric', metricPressure: 'bar' },
];

describe("figures in the company's units", () => {
  it('come back as they were', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...kinds),
        fc.constantFrom(...choices),
        fc.double({ min: -450, max: 1e5, noNaN: true }),
        (kind, choice, value) => {
          const there = toCompanyUnit(kind, value, choice);
          if (!there.ok) return false;
          const back = fromCompanyUnit(kind, there.value, choice);
          return back.ok && Math.abs(back.value - value) <= 1e-9 * Math.max(1000, Math.abs(value));
        },
      ),
    );
  });
  it('are left alone under US customary units', () => {
    for (const kind of kinds) {
      expect(toCompanyUnit(kind, 61.5, { units: 'us', metricPressure: 'kPa' })).toEqual({
        ok: true,
        value: 61.5,
      });
    }
  });
  it('50 psi are 344.74 kPa and 3.4474 bar (GNU units, published)', () => {
    const kPa = toCompanyUnit('pressure', 50, { units: 'metric', metricPressure: 'kPa' });
    const bar = toCompanyUnit('pressure', 50, { units: 'metric', metricPressure: 'bar' });
    expect(kPa.ok && kPa.value).toBeCloseTo(344.738, 3);
    expect(bar.ok && bar.value).toBeCloseTo(3.44738, 5);
  });
});
