import { describe, expect, it } from 'vitest';
import { clockText } from './clock-text';

describe('clock text', () => {
  it('writes minutes and seconds', () => {
    expect([0, 999, 61_000, 3_600_000, -5].map(clockText)).toEqual(['0:00', '0:00', '1:01', '60:00', '0:00']);
  });
});
