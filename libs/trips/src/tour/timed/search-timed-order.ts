import type { RandomSource } from '../../random/seeded-random';
import { randomBelow } from '../starting-orders';
import { TimedImprover } from './timed-improver';
import { weighOrder, type TimedDay } from './timed-day';

/** Stops driven to, in thought, before the search ends: about a tenth of a second on a small machine. */
const usualBudget = 2_500_000;
const longestShake = 10;

/**
 * A good order of a day with times. Each starting order is improved until nothing helps; then the best is shaken (two
 * neighbouring stretches change places) and improved until the budget of looked-at stops is used up. Never weighs
 * more than any of the starts; the same random numbers give the same order.
 */
export function searchTimedOrder(
  day: TimedDay,
  starts: readonly (readonly number[])[],
  random: RandomSource,
  budget = usualBudget,
): number[] {
  const improver = new TimedImprover(day, budget);
  let best: number[] = [];
  let bestWeight = Infinity;
  for (const start of starts) {
    const found = improver.improve(start);
    const weight = weighOrder(day, found);
    if (weight < bestWeight) [best, bestWeight] = [found, weight];
  }
  while (!improver.exhausted && day.stops > 3) {
    const found = improver.improve(shaken(best, random));
    const weight = weighOrder(day, found);
    if (weight <= bestWeight) [best, bestWeight] = [found, weight];
  }
  return best;
}

function shaken(order: readonly number[], random: RandomSource): number[] {
  const start = randomBelow(random, order.length - 1);
  const room = order.length - start;
  const first = 1 + randomBelow(random, Math.min(longestShake, room - 1));
  const second = 1 + randomBelow(random, Math.min(longestShake, room - first));
  return [
    ...order.slice(0, start),
    ...order.slice(start + first, start + first + second),
    ...order.slice(start, start + first),
    ...order.slice(start + first + second),
  ];
}
