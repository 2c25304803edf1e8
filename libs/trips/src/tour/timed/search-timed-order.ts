import type { RandomSource } from '../../random/seeded-random';
import { randomBelow } from '../starting-orders';
import { dayStart, goTo, weighDay, weighOrder, type DayState, type TimedDay } from './timed-day';

/** Stops driven to, in thought, before the search ends: about a fifth of a second on a small machine. */
const usualBudget = 5_000_000;
const longestMovedStretch = 3;

/**
 * A good order of a day with times. From the order of the windows' ends, the given order and the order by driving,
 * stretches are turned and moved until nothing helps; then the best is shaken and improved until the budget of
 * looked-at stops is used up. Never weighs more than the given order; the same random numbers give the same order.
 */
export function searchTimedOrder(
  day: TimedDay,
  starts: readonly (readonly number[])[],
  random: RandomSource,
  budget = usualBudget,
): number[] {
  const search = new TimedSearch(day, budget);
  let best: number[] = [];
  let bestWeight = Infinity;
  for (const start of starts) {
    const found = search.improve([...start]);
    const weight = weighOrder(day, found);
    if (weight < bestWeight) [best, bestWeight] = [found, weight];
  }
  while (!search.exhausted && day.stops > 3) {
    const found = search.improve(shaken(best, random));
    const weight = weighOrder(day, found);
    if (weight <= bestWeight) [best, bestWeight] = [found, weight];
  }
  return best;
}

/** Lets two neighbouring stretches change places. */
function shaken(order: readonly number[], random: RandomSource): number[] {
  const start = randomBelow(random, order.length - 1);
  const room = order.length - start;
  const first = 1 + randomBelow(random, Math.min(10, room - 1));
  const second = 1 + randomBelow(random, Math.min(10, room - first));
  return [
    ...order.slice(0, start),
    ...order.slice(start + first, start + first + second),
    ...order.slice(start, start + first),
    ...order.slice(start + first + second),
  ];
}

class TimedSearch {
  private used = 0;

  constructor(
    private readonly day: TimedDay,
    private readonly budget: number,
  ) {}

  get exhausted(): boolean {
    return this.used >= this.budget;
  }

  /** Takes every move that helps until a whole round brings none, or the budget is gone. */
  improve(order: number[]): number[] {
    let current = order;
    for (let better = this.round(current); better && !this.exhausted; better = this.round(current))
      current = better;
    return current;
  }

  /** One round over all moves, going on from each that helps. Undefined when none did. */
  private round(order: readonly number[]): number[] | undefined {
    let best = [...order];
    let states = this.statesOf(best);
    let weight = weighDay(this.day, states.at(-1) as DayState);
    let helped = false;
    for (let from = 0; from < best.length && !this.exhausted; from++)
      for (let to = 0; to < best.length; to++)
        for (const move of movesBetween(from, to, best.length)) {
          const candidate = moved(best, move);
          const firstChanged = Math.min(move.from, move.to);
          const found = this.weighFrom(
            candidate,
            firstChanged,
            states[firstChanged] as DayState,
            weight - 1e-9,
          );
          if (found === undefined) continue;
          [best, weight, helped] = [candidate, found, true];
          states = this.statesOf(best);
        }
    return helped ? best : undefined;
  }

  private statesOf(order: readonly number[]): DayState[] {
    const states = [dayStart(this.day)];
    for (const stop of order) states.push(goTo(this.day, states.at(-1) as DayState, stop));
    this.used += order.length;
    return states;
  }

  /** Weight of an order whose first stops are unchanged; undefined as soon as it cannot come under `limit`. */
  private weighFrom(
    order: readonly number[],
    from: number,
    state: DayState,
    limit: number,
  ): number | undefined {
    let current = state;
    for (let at = from; at < order.length; at++) {
      this.used++;
      current = goTo(this.day, current, order[at] as number);
      if (current.charged + current.minute - this.day.departMinute >= limit) return undefined;
    }
    const weight = weighDay(this.day, current);
    return weight < limit ? weight : undefined;
  }
}

/** Move the stretch of `length` stops at `from` to begin at `to`, or (length 0) turn all from `from` to `to` around. */
interface Move {
  from: number;
  to: number;
  length: number;
}

function* movesBetween(from: number, to: number, stops: number): Generator<Move> {
  if (to > from + 1) yield { from, to, length: 0 };
  if (to === from) return;
  for (let length = 1; length <= longestMovedStretch; length++)
    if (from + length <= stops && to + length <= stops) yield { from, to, length };
}

function moved(order: readonly number[], { from, to, length }: Move): number[] {
  if (length === 0) {
    const turned = order.slice(from, to + 1).reverse();
    return [...order.slice(0, from), ...turned, ...order.slice(to + 1)];
  }
  const rest = [...order];
  const stretch = rest.splice(from, length);
  rest.splice(to, 0, ...stretch);
  return rest;
}
