import { costOf, type CostMatrix } from '../cost-matrix';

/**
 * A day with times, ready for a search. Place 0 is the yard; the others are stops. Minutes are minutes since
 * midnight. A stop without a window opens at minus infinity and closes at infinity.
 */
export interface TimedDay {
  /** Driving minutes between places. */
  costs: CostMatrix;
  /** Number of stops: places 1 to `stops`. Places beyond are ends of the day, never visited in between. */
  stops: number;
  serviceMinutes: Float64Array;
  opensMinute: Float64Array;
  closesMinute: Float64Array;
  departMinute: number;
  /** Minutes driven after the last stop (0 as last stop is a day without stops). */
  closing: (last: number) => number;
}

/** Each late minute weighs as much as this many minutes of the crew's day. */
export const lateWeight = 1000;

/** The state of a day after some of its stops. */
export interface DayState {
  place: number;
  /** When the crew leaves the place. */
  minute: number;
  /** Weighed cost so far without the length of the day: driving, and lateness. */
  charged: number;
}

/** The day before the first stop. */
export const dayStart = (day: TimedDay): DayState => ({ place: 0, minute: day.departMinute, charged: 0 });

/** Drives to a stop, waits for its window, works. Late is the time by which work begins after the window closes. */
export function goTo(day: TimedDay, state: DayState, stop: number): DayState {
  const travel = costOf(day.costs, state.place, stop);
  const begin = Math.max(state.minute + travel, day.opensMinute[stop] as number);
  const late = Math.max(0, begin - (day.closesMinute[stop] as number));
  return {
    place: stop,
    minute: begin + (day.serviceMinutes[stop] as number),
    charged: state.charged + travel + lateWeight * late,
  };
}

/**
 * What a whole day weighs: its length in minutes, plus its driving minutes once more, plus 1000 for each late minute.
 * Driving counts twice so that a crew that has to wait for a window anyway does not drive in circles meanwhile.
 */
export function weighDay(day: TimedDay, state: DayState): number {
  const closing = day.closing(state.place);
  return state.charged + closing + (state.minute + closing - day.departMinute);
}

/** What an order of stops weighs. */
export function weighOrder(day: TimedDay, order: readonly number[]): number {
  let state = dayStart(day);
  for (const stop of order) state = goTo(day, state, stop);
  return weighDay(day, state);
}
