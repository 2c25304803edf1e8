import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { seededRandom } from '../../random/seeded-random';
import { costMatrix } from '../cost-matrix';
import { exactTimedOrder } from './exact-timed-order';
import { allMoves, firstChanged, lastChanged, positionBefore } from './order-move';
import { searchTimedOrder } from './search-timed-order';
import { weighOrder, type TimedDay } from './timed-day';

const anyDay = (stops: number): fc.Arbitrary<TimedDay> =>
  fc.integer().map((seed) => {
    const random = seededRandom(seed);
    const spots = Array.from({ length: stops + 1 }, () => [random() * 40, random() * 40] as const);
    const costs = costMatrix(stops + 1, (a, b) =>
      Math.hypot((spots[a]?.[0] ?? 0) - (spots[b]?.[0] ?? 0), (spots[a]?.[1] ?? 0) - (spots[b]?.[1] ?? 0)),
    );
    const opens = Float64Array.from(spots, () => 480 + random() * 300);
    return {
      costs,
      stops,
      serviceMinutes: Float64Array.from(spots, () => random() * 30),
      opensMinute: opens,
      closesMinute: opens.map((minute) => minute + random() * 200),
      departMinute: 480,
      closing: (last) => costs.values[last] as number,
    };
  });

describe('days with times', () => {
  it('are searched to within 1 % of the exact method where both can be had, and never below it', () => {
    let within = 0;
    let days = 0;
    fc.assert(
      fc.property(anyDay(9), (day) => {
        const exact = weighOrder(day, exactTimedOrder(day));
        const given = [1, 2, 3, 4, 5, 6, 7, 8, 9];
        const found = weighOrder(day, searchTimedOrder(day, [given], seededRandom(2), 500_000));
        expect(found).toBeGreaterThanOrEqual(exact - 1e-6);
        expect(found).toBeLessThanOrEqual(weighOrder(day, given) + 1e-6);
        days++;
        if (found <= exact * 1.01 + 1e-6) within++;
      }),
      { numRuns: 40, seed: 11 },
    );
    expect(within / days).toBeGreaterThanOrEqual(0.95);
  }, 30_000);

  it('change by moves that keep every stop and leave the rest alone', () => {
    const order = [10, 11, 12, 13, 14, 15, 16];
    for (const move of allMoves(order.length, 3)) {
      const changed = order.map((stop, at) =>
        at < firstChanged(move) || at > lastChanged(move) ? stop : (order[positionBefore(move, at)] ?? -1),
      );
      const expected = [...order];
      if (move.length === 0)
        expected.splice(move.from, move.to - move.from + 1, ...order.slice(move.from, move.to + 1).reverse());
      else expected.splice(move.to, 0, ...expected.splice(move.from, move.length));
      expect(changed).toEqual(expected);
    }
  });
});
