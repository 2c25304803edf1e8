import type { RandomSource } from '../random/seeded-random';
import type { GeoPoint } from '../travel/great-circle';
import type { TravelOptions } from '../travel/travel-minutes';

/** Hours in which work at a stop may begin, in minutes since local midnight. */
export interface TimeWindow {
  fromMinute: number;
  toMinute: number;
}

/** A stop of a day. */
export interface TourStop {
  id: string;
  location: GeoPoint | null;
  /** Minutes of work; null when nobody has said. */
  serviceMinutes: number | null;
  window?: TimeWindow;
}

/** Where the day ends: back at the yard, wherever the last stop is, or at another place. */
export type DayEnd = 'yard' | 'last-stop' | GeoPoint;

/** A crew's day to be put in order. */
export interface DayRequest {
  yard: GeoPoint;
  stops: readonly TourStop[];
  /** When the crew leaves the yard, minutes since local midnight. */
  departMinute: number;
  /** `yard` is assumed. */
  end?: DayEnd;
  travel?: TravelOptions;
  random: RandomSource;
}
