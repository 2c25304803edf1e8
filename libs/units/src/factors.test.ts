import { describe, expect, it } from 'vitest';
import gnu from '../fixtures/gnu-units.json';
import * as factors from './factors';

describe(`exact factors agree with ${gnu.version} (independent reference)`, () => {
  for (const { ours, from, to, value } of gnu.factors) {
    if (ours === null) continue;
    it(`${ours}: one ${from} in ${to}`, () => {
      const factor = factors[ours as keyof typeof factors];
      expect(Math.abs(factor / value - 1)).toBeLessThan(1e-12);
    });
  }
});

describe('exact factors against published figures', () => {
  it('one US gallon is 0.13368056 ft3 (GNU units, published)', () => {
    expect(1 / factors.galPerFt3).toBeCloseTo(0.13368056, 8);
  });
  it('the standard atmosphere is 14.6959 psia (US Standard Atmosphere 1976, published)', () => {
    expect(factors.standardAtmospherePsia).toBeCloseTo(14.6959, 4);
  });
});
