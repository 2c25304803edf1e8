import type { RandomSource } from '../random/seeded-random';
import { costOf, type CostMatrix } from './cost-matrix';

/** Goes from a place to the nearest one not yet visited, until all are. */
export function nearestFirst(costs: CostMatrix, start: number): number[] {
  const order = [start];
  const left = new Set(Array.from({ length: costs.size }, (_, place) => place));
  left.delete(start);
  for (let here = start; left.size > 0;) {
    let nearest = -1;
    for (const place of left)
      if (nearest < 0 || costOf(costs, here, place) < costOf(costs, here, nearest)) nearest = place;
    left.delete(nearest);
    order.push(nearest);
    here = nearest;
  }
  return order;
}

/** A whole number from 0 to `below - 1`. */
export const randomBelow = (random: RandomSource, below: number): number => Math.floor(random() * below);
