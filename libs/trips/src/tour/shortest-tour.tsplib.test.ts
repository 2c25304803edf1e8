import { describe, expect, it } from 'vitest';
import { seededRandom } from '../random/seeded-random';
import { readCsv } from '../testing/fixtures';
import { tsplibCosts } from '../testing/tsplib';
import { closedLength } from './search-tour';
import { shortestTour } from './shortest-tour';
import { cheapestOrder } from './held-karp';

/** Optima published with TSPLIB (G. Reinelt), coordinates of the fixtures checked as docs/trips.md says. */
const published = [
  ['burma14', 14, 3323],
  ['ulysses16', 16, 6859],
  ['eil51', 51, 426],
  ['berlin52', 52, 7542],
  ['st70', 70, 675],
  ['eil76', 76, 538],
  ['kroA100', 100, 21282],
] as const;

describe('tours against TSPLIB optima (published)', () => {
  for (const [name, places, optimum] of published) {
    it(`${name}: ${places} places, within 2 % of ${optimum} and never below, for five seeds`, () => {
      const costs = tsplibCosts(name);
      expect(costs.size).toBe(places);
      for (const seed of [1, 2, 3, 4, 5]) {
        const tour = shortestTour(costs, { end: 'closed', random: seededRandom(seed) });
        if (!tour.ok) throw new Error(JSON.stringify(tour.error));
        expect(new Set(tour.value.order).size).toBe(places);
        expect(closedLength(costs, tour.value.order)).toBe(tour.value.length);
        expect(tour.value.length).toBeGreaterThanOrEqual(optimum);
        expect(tour.value.length).toBeLessThanOrEqual(optimum * 1.02);
      }
    }, 30_000);

    it(`${name}: the optimum ${optimum} itself is found from one of ten seeds`, () => {
      const costs = tsplibCosts(name);
      let shortest = Infinity;
      for (let seed = 1; seed <= 10 && shortest > optimum; seed++) {
        const tour = shortestTour(costs, { end: 'closed', random: seededRandom(seed) });
        if (tour.ok) shortest = Math.min(shortest, tour.value.length);
      }
      expect(shortest).toBe(optimum);
    }, 30_000);
  }

  it('burma14: is small enough for the exact method, which gives 3323', () => {
    const tour = shortestTour(tsplibCosts('burma14'), { end: 'closed', random: seededRandom(1) });
    expect(tour.ok && [tour.value.method, tour.value.length]).toEqual(['exact', 3323]);
  });

  it('ulysses16: the exact method gives 6859', () => {
    const costs = tsplibCosts('ulysses16');
    expect(
      closedLength(
        costs,
        cheapestOrder(costs, (last) => costs.values[last * 16] as number),
      ),
    ).toBe(6859);
  });

  it('berlin52: the published optimal tour has the published length with these coordinates', () => {
    const tour = readCsv('berlin52_opt_tour.csv').map((row) => Number(row['node']) - 1);
    expect(closedLength(tsplibCosts('berlin52'), tour)).toBe(7542);
  });
});

describe('tours against exact optima of an integer program (independent, scipy with HiGHS, versions in the fixture)', () => {
  const exact = readCsv('exact_optima.csv').map(
    (row) => [row['instance'] ?? '', Number(row['optimum'])] as const,
  );

  it('agree with the published optimum of every instance that both have', () => {
    const both = published.filter(([name]) => exact.some(([other]) => other === name));
    expect(both.length).toBe(5);
    for (const [name, , optimum] of both) expect(exact.find(([other]) => other === name)?.[1]).toBe(optimum);
  });

  for (const [name, optimum] of exact.filter(([instance]) => instance.startsWith('uniform100')))
    it(`${name}: 100 places by chance, within 2 % of ${optimum} and never below, for three seeds`, () => {
      const costs = tsplibCosts(name);
      expect(costs.size).toBe(100);
      for (const seed of [1, 2, 3]) {
        const tour = shortestTour(costs, { end: 'closed', random: seededRandom(seed) });
        if (!tour.ok) throw new Error(JSON.stringify(tour.error));
        expect(tour.value.length).toBeGreaterThanOrEqual(optimum);
        expect(tour.value.length).toBeLessThanOrEqual(optimum * 1.02);
      }
    }, 30_000);
});
