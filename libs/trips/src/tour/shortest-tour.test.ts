import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { seededRandom } from '../random/seeded-random';
import { everyOrder } from '../testing/every-order';
import { costMatrix, type CostMatrix } from './cost-matrix';
import { exactPlaces } from './held-karp';
import { searchTour } from './search-tour';
import { shortestTour, tourLength, type Tour, type TourEnd, type TourOptions } from './shortest-tour';

const point = fc.record({ x: fc.integer({ min: 0, max: 50 }), y: fc.integer({ min: 0, max: 50 }) });
const plane = (min: number, max: number): fc.Arbitrary<CostMatrix> =>
  fc
    .array(point, { minLength: min, maxLength: max })
    .map((points) =>
      costMatrix(points.length, (a, b) =>
        Math.hypot((points[a]?.x ?? 0) - (points[b]?.x ?? 0), (points[a]?.y ?? 0) - (points[b]?.y ?? 0)),
      ),
    );
/** Costs that follow no map at all. */
const wild = (min: number, max: number): fc.Arbitrary<CostMatrix> =>
  fc.tuple(fc.integer({ min, max }), fc.integer()).map(([size, seed]) => {
    const random = seededRandom(seed);
    return costMatrix(size, () => Math.floor(random() * 100));
  });
const ends = (size: number): TourEnd[] =>
  size > 1 ? ['closed', 'open', { at: size - 1 }] : ['closed', 'open'];

function found(costs: CostMatrix, options: Partial<TourOptions> & { end: TourEnd }): Tour {
  const tour = shortestTour(costs, {
    random: seededRandom(7),
    effort: { starts: 2, shakesPerStart: 50 },
    ...options,
  });
  if (!tour.ok) throw new Error(JSON.stringify(tour.error));
  return tour.value;
}
const endOf = (end: TourEnd): 'closed' | 'open' | number => (typeof end === 'object' ? end.at : end);

describe('shortestTour', () => {
  it('goes through every place once, from place 0 to the end asked for, and tells its true length', () => {
    fc.assert(
      fc.property(fc.oneof(plane(1, 40), wild(1, 40)), (costs) => {
        for (const end of ends(costs.size)) {
          const { order, length } = found(costs, { end });
          expect([...order].sort((a, b) => a - b)).toEqual(Array.from({ length: costs.size }, (_, at) => at));
          expect(order[0]).toBe(0);
          if (typeof end === 'object') expect(order.at(-1)).toBe(end.at);
          expect(length).toBeCloseTo(tourLength(costs, order, endOf(end)), 9);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('is never longer than the order given', () => {
    fc.assert(
      fc.property(fc.oneof(plane(14, 60), wild(14, 60)), fc.integer(), (costs, seed) => {
        const random = seededRandom(seed);
        const inner = Array.from({ length: costs.size - 2 }, (_, at) => at + 1);
        inner.sort(() => random() - 0.5);
        const given = [0, ...inner, costs.size - 1];
        for (const end of ends(costs.size))
          expect(found(costs, { end, given }).length).toBeLessThanOrEqual(
            tourLength(costs, given, endOf(end)) + 1e-9,
          );
      }),
      { numRuns: 40 },
    );
  });

  it('gives the same tour for the same seed', () => {
    fc.assert(
      fc.property(plane(14, 50), fc.integer(), (costs, seed) => {
        const once = found(costs, { end: 'open', random: seededRandom(seed) });
        expect(found(costs, { end: 'open', random: seededRandom(seed) })).toEqual(once);
      }),
      { numRuns: 30 },
    );
  });

  it('is the shortest of all orders for up to seven places', () => {
    fc.assert(
      fc.property(fc.oneof(plane(2, 7), wild(2, 7)), (costs) => {
        for (const end of ends(costs.size)) {
          const inner = Array.from({ length: costs.size - 1 }, (_, at) => at + 1);
          const lengths = everyOrder(inner)
            .filter((order) => typeof end !== 'object' || order.at(-1) === end.at)
            .map((order) => tourLength(costs, [0, ...order], endOf(end)));
          const tour = found(costs, { end });
          expect(tour.method).toBe('exact');
          expect(tour.length).toBeCloseTo(Math.min(...lengths), 9);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('searches about as well as the exact method at the size where they meet', () => {
    fc.assert(
      fc.property(plane(exactPlaces + 1, exactPlaces + 1), fc.integer(), (costs, seed) => {
        const given = Array.from({ length: costs.size }, (_, at) => at);
        const order = searchTour(costs, given, seededRandom(seed));
        const exact = found(costs, { end: 'closed' }).length;
        expect(tourLength(costs, order, 'closed')).toBeLessThanOrEqual(exact * 1.02 + 1e-9);
        expect(tourLength(costs, order, 'closed')).toBeGreaterThanOrEqual(exact - 1e-9);
      }),
      { numRuns: 15 },
    );
  });

  it('ends an open tour where it is cheapest: along a line, at the far end', () => {
    const costs = costMatrix(30, (a, b) => Math.abs(a - b));
    const shuffled = [0, ...Array.from({ length: 29 }, (_, at) => ((at * 11) % 29) + 1)];
    const open = found(costs, { end: 'open', given: shuffled });
    expect(open.length).toBe(29);
    expect(open.order).toEqual(Array.from({ length: 30 }, (_, at) => at));
    const ended = found(costs, { end: { at: 3 } });
    expect(ended.length).toBe(29 + 26);
  });

  it('refuses costs that differ by direction, are negative or unending, and orders that leave a place out', () => {
    const random = seededRandom(1);
    const oneWay = { size: 2, values: Float64Array.from([0, 1, 2, 0]) };
    expect(shortestTour(oneWay, { end: 'closed', random })).toEqual({
      ok: false,
      error: { kind: 'out-of-range', field: 'costs', range: 'the same both ways' },
    });
    const negative = { size: 2, values: Float64Array.from([0, -1, -1, 0]) };
    expect(shortestTour(negative, { end: 'closed', random }).ok).toBe(false);
    expect(shortestTour({ size: 3, values: new Float64Array(4) }, { end: 'closed', random }).ok).toBe(false);
    const costs = costMatrix(3, () => 1);
    expect(shortestTour(costs, { end: { at: 0 }, random })).toMatchObject({ error: { field: 'end' } });
    expect(shortestTour(costs, { end: 'open', random, given: [0, 1] })).toMatchObject({
      error: { kind: 'needs' },
    });
    expect(shortestTour(costs, { end: 'open', random, given: [1, 0, 2] })).toMatchObject({
      error: { field: 'given' },
    });
  });
});
