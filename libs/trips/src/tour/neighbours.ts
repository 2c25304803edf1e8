import { costOf, type CostMatrix } from './cost-matrix';

/** For each place its nearest others, nearest first: `perPlace` entries a row. */
export interface NeighbourLists {
  readonly perPlace: number;
  readonly values: Int32Array;
}

/** Builds neighbour lists of at most `most` places each. Ties go to the lower number, so that lists repeat. */
export function neighbourLists(costs: CostMatrix, most: number): NeighbourLists {
  const perPlace = Math.min(most, costs.size - 1);
  const values = new Int32Array(costs.size * perPlace);
  const places = Array.from({ length: costs.size }, (_, place) => place);
  for (const place of places) {
    const others = places.filter((other) => other !== place);
    others.sort((a, b) => costOf(costs, place, a) - costOf(costs, place, b) || a - b);
    values.set(others.slice(0, perPlace), place * perPlace);
  }
  return { perPlace, values };
}
