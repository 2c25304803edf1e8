import { dayStart, goTo, weighDay, type DayState, type TimedDay } from './timed-day';

/** Most stops for which every useful order of a day with times is looked at. */
export const exactTimedStops = 9;

interface Label extends DayState {
  before: Label | undefined;
}

/**
 * The order that weighs least, by dynamic programming over sets of stops. For each set and last stop all states are
 * kept that are neither later nor dearer than another: what follows can only grow with both.
 */
export function exactTimedOrder(day: TimedDay): number[] {
  const sets = 1 << day.stops;
  const states = new Map<number, Label[]>();
  const start: Label = { ...dayStart(day), before: undefined };
  extend(day, start, 0, states);
  for (let set = 1; set < sets; set++)
    for (let last = 1; last <= day.stops; last++)
      for (const label of states.get(set * (day.stops + 1) + last) ?? []) extend(day, label, set, states);
  let best: Label | undefined;
  for (let last = 1; last <= day.stops; last++)
    for (const label of states.get((sets - 1) * (day.stops + 1) + last) ?? [])
      if (!best || weighDay(day, label) < weighDay(day, best)) best = label;
  const order: number[] = [];
  for (let label = best; label?.before; label = label.before) order.push(label.place);
  return order.reverse();
}

function extend(day: TimedDay, label: Label, set: number, states: Map<number, Label[]>): void {
  for (let stop = 1; stop <= day.stops; stop++) {
    const bit = 1 << (stop - 1);
    if (set & bit) continue;
    const next: Label = { ...goTo(day, label, stop), before: label };
    const key = (set | bit) * (day.stops + 1) + stop;
    const known = states.get(key) ?? [];
    if (known.some((other) => other.minute <= next.minute && other.charged <= next.charged)) continue;
    const kept = known.filter((other) => other.minute < next.minute || other.charged < next.charged);
    states.set(key, [...kept, next]);
  }
}
