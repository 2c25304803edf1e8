import { allMoves, firstChanged, lastChanged, positionBefore, type OrderMove } from './order-move';
import { lateWeight, type TimedDay } from './timed-day';

const longestMovedStretch = 3;
/** A gain smaller than this is rounding. */
const leastGain = 1e-7;

/**
 * Improves orders of a day with times by turning and moving stretches. A move is weighed only from the first stop it
 * changes, and given up as soon as it can no longer help; every stop looked at counts against the budget.
 */
export class TimedImprover {
  private used = 0;
  private readonly moves: OrderMove[];
  private readonly order: Int32Array;
  /** State before each position of the order, and after the last: minute, and weighed cost without the day's length. */
  private readonly minutes: Float64Array;
  private readonly charges: Float64Array;

  constructor(
    private readonly day: TimedDay,
    private readonly budget: number,
  ) {
    this.moves = allMoves(day.stops, longestMovedStretch);
    this.order = new Int32Array(day.stops);
    this.minutes = new Float64Array(day.stops + 1);
    this.charges = new Float64Array(day.stops + 1);
  }

  /** True when the budget is used up. */
  get exhausted(): boolean {
    return this.used >= this.budget;
  }

  /** Takes every move that helps, round after round, until none does or the budget is gone. */
  improve(order: readonly number[]): number[] {
    this.order.set(order);
    this.walk(0);
    for (let helped = true; helped && !this.exhausted;) {
      helped = false;
      for (const move of this.moves) {
        if (this.exhausted) break;
        if (!this.helps(move)) continue;
        this.make(move);
        helped = true;
      }
    }
    return Array.from(this.order);
  }

  private helps(move: OrderMove): boolean {
    const { day, order, minutes, charges } = this;
    const { costs, serviceMinutes, opensMinute, closesMinute, stops } = day;
    const first = firstChanged(move);
    const last = lastChanged(move);
    let minute = minutes[first] as number;
    let charged = charges[first] as number;
    let here = first === 0 ? 0 : (order[first - 1] as number);
    const total =
      (minutes[stops] as number) + (charges[stops] as number) + 2 * day.closing(order[stops - 1] as number);
    for (let at = first; at < stops; at++) {
      this.used++;
      const stop = order[at > last ? at : positionBefore(move, at)] as number;
      const travel = costs.values[here * costs.size + stop] as number;
      const begin = Math.max(minute + travel, opensMinute[stop] as number);
      const late = begin - (closesMinute[stop] as number);
      minute = begin + (serviceMinutes[stop] as number);
      charged += late > 0 ? travel + lateWeight * late : travel;
      here = stop;
      if (minute + charged >= total - leastGain) return false;
      if (at <= last) continue;
      // From here on the stops are the same: what is neither earlier nor cheaper stays so.
      const earlier = (minutes[at + 1] as number) - minute;
      const cheaper = (charges[at + 1] as number) - charged;
      if (earlier <= 0 && cheaper <= 0) return false;
    }
    return minute + charged + 2 * day.closing(here) < total - leastGain;
  }

  private make(move: OrderMove): void {
    const before = this.order.slice();
    const first = firstChanged(move);
    for (let at = first; at <= lastChanged(move); at++)
      this.order[at] = before[positionBefore(move, at)] as number;
    this.walk(first);
  }

  /** Writes down the states from a position on. */
  private walk(from: number): void {
    const { day, order, minutes, charges } = this;
    if (from === 0) [minutes[0], charges[0]] = [day.departMinute, 0];
    for (let at = from; at < day.stops; at++) {
      const stop = order[at] as number;
      const here = at === 0 ? 0 : (order[at - 1] as number);
      const travel = day.costs.values[here * day.costs.size + stop] as number;
      const begin = Math.max((minutes[at] as number) + travel, day.opensMinute[stop] as number);
      const late = Math.max(0, begin - (day.closesMinute[stop] as number));
      minutes[at + 1] = begin + (day.serviceMinutes[stop] as number);
      charges[at + 1] = (charges[at] as number) + travel + lateWeight * late;
    }
    this.used += day.stops - from;
  }
}
