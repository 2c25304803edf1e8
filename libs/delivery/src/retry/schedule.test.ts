import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nextWaitMs } from './schedule';

const random = fc.double({ min: 0, max: 0.999_999, noNaN: true });

describe('nextWaitMs', () => {
  it('comes back after 30 to 60 s while all is well', () => {
    fc.assert(
      fc.property(random, (value) => {
        const waitMs = nextWaitMs(0, null, () => value);
        expect(waitMs >= 30_000 && waitMs <= 60_000).toBe(true);
      }),
    );
  });

  it('never waits longer than a minute by itself, however often it failed', () => {
    fc.assert(
      fc.property(random, fc.integer({ min: 1, max: 10_000 }), (value, failures) => {
        const waitMs = nextWaitMs(failures, null, () => value);
        expect(waitMs > 0 && waitMs <= 60_000).toBe(true);
      }),
    );
  });

  it('spreads phones that failed together over the whole wait', () => {
    expect(nextWaitMs(4, null, () => 0)).toBe(500);
    expect(nextWaitMs(4, null, () => 0.999)).toBeGreaterThan(15_000);
  });

  it('never undercuts what the office asked for', () => {
    fc.assert(
      fc.property(
        random,
        fc.integer({ min: 0, max: 20 }),
        fc.integer({ min: 0, max: 600_000 }),
        (value, failures, askedMs) => {
          expect(nextWaitMs(failures, askedMs, () => value)).toBeGreaterThanOrEqual(askedMs);
        },
      ),
    );
  });
});
