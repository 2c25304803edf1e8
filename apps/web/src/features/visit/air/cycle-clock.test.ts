import { describe, expect, it } from 'vitest';
import { elapsedBySteadyClock } from './cycle-clock';

describe('length of a cycle by the steady clock', () => {
  const mark = { cycleId: 'a', steadyMs: 1_000, wallMs: 50_000 };

  it('counts when both clocks agree', () => {
    expect(elapsedBySteadyClock(mark, 'a', { steadyMs: 61_000, wallMs: 110_400 })).toBe(60_000);
  });
  it('does not count after ten minutes of sleep', () => {
    expect(elapsedBySteadyClock(mark, 'a', { steadyMs: 11_000, wallMs: 660_000 })).toBeNull();
  });
  it('does not count when the wall clock was set back', () => {
    expect(elapsedBySteadyClock(mark, 'a', { steadyMs: 61_000, wallMs: -3_600_000 })).toBeNull();
  });
  it('does not count for another cycle or after a reload', () => {
    expect(elapsedBySteadyClock(mark, 'b', { steadyMs: 61_000, wallMs: 110_000 })).toBeNull();
    expect(elapsedBySteadyClock(null, 'a', { steadyMs: 61_000, wallMs: 110_000 })).toBeNull();
    expect(elapsedBySteadyClock(mark, 'a', { steadyMs: 10, wallMs: 49_010 })).toBeNull();
  });
});
