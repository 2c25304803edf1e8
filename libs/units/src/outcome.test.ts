import { describe, expect, it } from 'vitest';
import { above, needs, outOfRange, success, within } from './outcome';

describe('results', () => {
  it('carry a value, what is missing, or what is impossible', () => {
    expect(success(3)).toEqual({ ok: true, value: 3 });
    expect(needs('flowGpm', 'lengthFt')).toEqual({
      ok: false,
      error: { kind: 'needs', fields: ['flowGpm', 'lengthFt'] },
    });
    expect(outOfRange('lengthFt', '0 to 5')).toMatchObject({ error: { field: 'lengthFt', range: '0 to 5' } });
  });
  it('refuse figures that are not numbers or leave the range, and allow both ends', () => {
    for (const value of [Number.NaN, Infinity, -1, 6]) expect(within('x', value, 0, 5)).not.toBeNull();
    for (const value of [0, 3, 5]) expect(within('x', value, 0, 5)).toBeNull();
  });
  it('refuse the lower end where a figure has to lie above it', () => {
    expect(above('x', 0, 0, 5)).toMatchObject({ error: { range: 'above 0, at most 5' } });
    expect(above('x', Number.NaN, 0, 5)).not.toBeNull();
    expect(above('x', 5, 0, 5)).toBeNull();
    expect(above('x', 6, 0, 5)).not.toBeNull();
  });
});
