import { needs, outOfRange, type Result, success } from '@rimeward/units';
import type { RandomSource } from '../random/seeded-random';
import { checkCosts, costMatrix, costOf, type CostMatrix } from './cost-matrix';
import { cheapestOrder, exactPlaces } from './held-karp';
import { searchTour, type SearchEffort } from './search-tour';

/** Where a tour ends: back at place 0, at whichever place is last, or at a given place. */
export type TourEnd = 'closed' | 'open' | { at: number };

/** How a tour is found. */
export interface TourOptions {
  end: TourEnd;
  random: RandomSource;
  /** Order to start from and never to be worse than; the order of numbers when left out. */
  given?: readonly number[];
  effort?: SearchEffort;
}

/** A tour that starts at place 0, with its length in the unit of the costs. */
export interface Tour {
  order: number[];
  length: number;
  method: 'exact' | 'search';
}

/**
 * A short tour from place 0 through all places: exact up to 13 places besides the start, a repeatable search beyond.
 * Costs have to be the same both ways. Never longer than the given order.
 */
export function shortestTour(costs: CostMatrix, options: TourOptions): Result<Tour> {
  const checked = checkCosts(costs);
  if (!checked.ok) return checked;
  const end = typeof options.end === 'object' ? options.end.at : options.end;
  if (typeof end === 'number' && !(Number.isInteger(end) && end > 0 && end < costs.size))
    return outOfRange('end', 'a place other than the start');
  const given = options.given ?? withEndLast(costs.size, end);
  if (
    given.length !== costs.size ||
    new Set(given).size !== costs.size ||
    given.some((place) => !(place in given))
  )
    return needs('given: every place once');
  if (given[0] !== 0 || (typeof end === 'number' && given.at(-1) !== end))
    return outOfRange('given', 'from place 0 to the end asked for');
  const exact = costs.size - 1 <= exactPlaces;
  const order = exact ? cheapestOrder(costs, closingCost(costs, end)) : search(costs, end, given, options);
  return success({ order, length: tourLength(costs, order, end), method: exact ? 'exact' : 'search' });
}

/** Length of an order of places with the end it has. */
export function tourLength(
  costs: CostMatrix,
  order: readonly number[],
  end: 'closed' | 'open' | number,
): number {
  let length = 0;
  for (let at = 1; at < order.length; at++)
    length += costOf(costs, order[at - 1] as number, order[at] as number);
  return end === 'closed' && order.length > 0
    ? length + costOf(costs, order.at(-1) as number, order[0] as number)
    : length;
}

function withEndLast(size: number, end: 'closed' | 'open' | number): number[] {
  const places = Array.from({ length: size }, (_, place) => place).filter((place) => place !== end);
  return typeof end === 'number' ? [...places, end] : places;
}

function closingCost(costs: CostMatrix, end: 'closed' | 'open' | number): (last: number) => number {
  if (end === 'closed') return (last) => costOf(costs, last, 0);
  if (end === 'open') return () => 0;
  return (last) => (last === end ? 0 : Infinity);
}

/**
 * An open tour is searched as a closed one: the last place is tied to the start by an edge so cheap that it is never
 * given up. For a free end, a place that costs nothing to reach stands between.
 */
function search(
  costs: CostMatrix,
  end: 'closed' | 'open' | number,
  given: readonly number[],
  options: TourOptions,
): number[] {
  if (end === 'closed') return fromStart(searchTour(costs, given, options.random, options.effort));
  const tied = end === 'open' ? costs.size : end;
  const bond = -2 * costs.values.reduce((sum, cost) => Math.max(sum, cost), 0) - 1;
  const closed = costMatrix(end === 'open' ? costs.size + 1 : costs.size, (row, column) => {
    if (row === 0 && column === tied) return bond;
    return column === costs.size ? 0 : costOf(costs, row, column);
  });
  const start = end === 'open' ? [...given, tied] : given;
  const order = fromStart(searchTour(closed, start, options.random, options.effort));
  const onward = order[1] === tied ? [0, ...order.slice(1).reverse()] : order;
  return end === 'open' ? onward.slice(0, -1) : onward;
}

function fromStart(order: readonly number[]): number[] {
  const start = order.indexOf(0);
  return [...order.slice(start), ...order.slice(0, start)];
}
