import type { RandomSource } from '../random/seeded-random';
import { costOf, type CostMatrix } from './cost-matrix';
import { neighbourLists } from './neighbours';
import { nearestFirst, randomBelow } from './starting-orders';
import { TourImprover } from './tour-improver';

/** Near neighbours tried for each place. */
const neighboursPerPlace = 10;
/** Longest stretch that a shake moves. */
const longestShake = 30;

/** How hard to search. */
export interface SearchEffort {
  /** Independent starts: the order given, then nearest-first from the start and from places by chance. */
  starts: number;
  /** Shakes of each start, each followed by improvement. */
  shakesPerStart: number;
}

/** The effort used when none is asked for: well under a tenth of a second of one core for 100 places on a small machine. */
export const usualEffort = (places: number): SearchEffort => ({ starts: 3, shakesPerStart: 10 * places });

/**
 * A short closed tour: from several starts, 2-opt and moving stretches until nothing helps, then small shakes (two
 * neighbouring stretches change places), each kept if the improved tour is not longer. Never longer than `given`.
 * The same random numbers give the same tour.
 */
export function searchTour(
  costs: CostMatrix,
  given: readonly number[],
  random: RandomSource,
  effort: SearchEffort = usualEffort(costs.size),
): number[] {
  const improver = new TourImprover(costs, neighbourLists(costs, neighboursPerPlace));
  let best: ArrayLike<number> = given;
  let bestCost = closedLength(costs, given);
  for (let start = 0; start < effort.starts; start++) {
    improver.load(startingOrder(costs, given, start, random));
    improver.improve();
    const found = shakeAndImprove(costs, improver, random, effort.shakesPerStart);
    const cost = closedLength(costs, found);
    if (cost < bestCost) [best, bestCost] = [found, cost];
  }
  return Array.from(best);
}

/** Length of a tour that ends where it starts. */
export function closedLength(costs: CostMatrix, order: ArrayLike<number>): number {
  let length = 0;
  for (let at = 0; at < order.length; at++)
    length += costOf(costs, order[at] as number, order[(at + 1) % order.length] as number);
  return length;
}

function startingOrder(
  costs: CostMatrix,
  given: readonly number[],
  start: number,
  random: RandomSource,
): readonly number[] {
  if (start === 0) return given;
  return nearestFirst(costs, start === 1 ? 0 : randomBelow(random, costs.size));
}

function shakeAndImprove(
  costs: CostMatrix,
  improver: TourImprover,
  random: RandomSource,
  shakes: number,
): Int32Array {
  const { tour } = improver;
  const kept = tour.order.slice();
  if (costs.size < 8) return kept;
  const longest = Math.min(longestShake, Math.floor(costs.size / 3));
  for (let shake = 0; shake < shakes; shake++) {
    const change = swapStretches(costs, improver, random, longest) + improver.improve();
    if (change <= 0) kept.set(tour.order);
    else tour.load(kept);
  }
  return kept;
}

/** Lets two neighbouring stretches change places (a double bridge close to one spot). Gives the change of cost. */
function swapStretches(
  costs: CostMatrix,
  improver: TourImprover,
  random: RandomSource,
  longest: number,
): number {
  const { tour } = improver;
  const start = randomBelow(random, costs.size);
  const first = 1 + randomBelow(random, longest);
  const second = 1 + randomBelow(random, longest);
  const before = tour.at(start - 1);
  const [firstHead, firstTail] = [tour.at(start), tour.at(start + first - 1)];
  const [secondHead, secondTail] = [tour.at(start + first), tour.at(start + first + second - 1)];
  const after = tour.at(start + first + second);
  tour.move(start, first, secondTail, false);
  for (const place of [before, firstHead, firstTail, secondHead, secondTail, after]) improver.mark(place);
  return (
    costOf(costs, before, secondHead) +
    costOf(costs, secondTail, firstHead) +
    costOf(costs, firstTail, after) -
    costOf(costs, before, firstHead) -
    costOf(costs, firstTail, secondHead) -
    costOf(costs, secondTail, after)
  );
}
