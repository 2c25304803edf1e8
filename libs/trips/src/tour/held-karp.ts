import { costOf, type CostMatrix } from './cost-matrix';

/** Most places, besides the start, that the exact method takes on: 2^13 sets of places are looked at. */
export const exactPlaces = 13;

/**
 * The cheapest order that starts at place 0 and goes once to every other place, by dynamic programming over sets of
 * places (held-karp-1962). `closing` is what is paid after the last place: the way back for a closed tour, nothing
 * for an open one.
 */
export function cheapestOrder(costs: CostMatrix, closing: (last: number) => number): number[] {
  const free = costs.size - 1;
  if (free < 1) return [0];
  const sets = 1 << free;
  const best = new Float64Array(sets * free).fill(Infinity);
  const previous = new Int8Array(sets * free).fill(-1);
  for (let last = 0; last < free; last++) best[(1 << last) * free + last] = costOf(costs, 0, last + 1);
  for (let set = 1; set < sets; set++)
    for (let last = 0; last < free; last++) {
      const reached = best[set * free + last] as number;
      if (reached === Infinity) continue;
      for (let next = 0; next < free; next++) {
        if (set & (1 << next)) continue;
        const at = (set | (1 << next)) * free + next;
        const cost = reached + costOf(costs, last + 1, next + 1);
        if (cost < (best[at] as number)) {
          best[at] = cost;
          previous[at] = last;
        }
      }
    }
  let last = 0;
  let cheapest = Infinity;
  for (let candidate = 0; candidate < free; candidate++) {
    const total = (best[(sets - 1) * free + candidate] as number) + closing(candidate + 1);
    if (total < cheapest) {
      cheapest = total;
      last = candidate;
    }
  }
  const order: number[] = [];
  for (let set = sets - 1; set > 0;) {
    order.push(last + 1);
    const before = previous[set * free + last] as number;
    set &= ~(1 << last);
    last = before;
  }
  return [0, ...order.reverse()];
}
