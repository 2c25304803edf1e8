import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { defaultThresholds, safeLimits, thresholdsOf } from './thresholds';

const names = Object.keys(safeLimits) as (keyof typeof safeLimits)[];

describe('thresholds of a company', () => {
  it('are the default ones where it has chosen none', () => {
    expect(thresholdsOf(undefined)).toEqual(defaultThresholds);
    expect(thresholdsOf({ restSeconds: Number.NaN })).toEqual(defaultThresholds);
  });

  it('are its own within the safe limits, and never outside them', () => {
    const choices = fc.record(Object.fromEntries(names.map((name) => [name, fc.double()])), {
      requiredKeys: [],
    });
    fc.assert(
      fc.property(choices, (chosen) => {
        const thresholds = thresholdsOf(chosen);
        for (const name of names) {
          const [low, high] = safeLimits[name];
          expect(thresholds[name]).toBeGreaterThanOrEqual(low);
          expect(thresholds[name]).toBeLessThanOrEqual(high);
        }
      }),
    );
    expect(thresholdsOf({ restSeconds: 90 }).restSeconds).toBe(90);
  });

  it('lie within their own limits by default', () => {
    expect(thresholdsOf(defaultThresholds)).toEqual(defaultThresholds);
  });
});
