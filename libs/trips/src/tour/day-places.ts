import { type Failure, needs, outOfRange, type Result, success, within } from '@rimeward/units';
import { firstFailure } from '../explain/first-failure';
import { checkPoint, haversineM, type GeoPoint } from '../travel/great-circle';
import { minutesForDistance, settleTravel, type SettledTravel } from '../travel/travel-minutes';
import { costMatrix } from './cost-matrix';
import type { DayEnd, DayRequest, TourStop } from './day-request';
import type { TimedDay } from './timed/timed-day';

/** A day's request, checked, with the driving between its places. */
export interface DayPlaces {
  day: TimedDay;
  end: DayEnd;
  travel: SettledTravel;
}

interface LocatedStop {
  location: GeoPoint;
  serviceMinutes: number;
  stop: TourStop;
}

/** Checks a request: needs a place and minutes for every stop; refuses impossible values, naming the stop. */
export function placeDay(request: DayRequest): Result<DayPlaces> {
  const travel = settleTravel(request.travel ?? {});
  if (!travel.ok) return travel;
  const end = request.end ?? 'yard';
  const located = locate(request.stops);
  if (!located.ok) return located;
  const refused =
    firstFailure(
      checkPoint('yard', request.yard),
      within('departMinute', request.departMinute, 0, 1440),
      typeof end === 'object' ? checkPoint('end', end) : undefined,
    ) ?? firstFailure(...located.value.map(checkStop));
  if (refused) return refused;

  const places = [request.yard, ...located.value.map((stop) => stop.location)];
  if (typeof end === 'object') places.push(end);
  const costs = costMatrix(places.length, (row, column) =>
    minutesForDistance(haversineM(places[row] as GeoPoint, places[column] as GeoPoint), travel.value),
  );
  const stops = located.value.length;
  const endPlace = end === 'yard' ? 0 : stops + 1;
  const day: TimedDay = {
    costs,
    stops,
    serviceMinutes: Float64Array.from([0, ...located.value.map((stop) => stop.serviceMinutes)]),
    opensMinute: Float64Array.from([
      -Infinity,
      ...located.value.map(({ stop }) => stop.window?.fromMinute ?? -Infinity),
    ]),
    closesMinute: Float64Array.from([
      Infinity,
      ...located.value.map(({ stop }) => stop.window?.toMinute ?? Infinity),
    ]),
    departMinute: request.departMinute,
    closing: end === 'last-stop' ? () => 0 : (last) => costs.values[last * costs.size + endPlace] as number,
  };
  return success({ day, end, travel: travel.value });
}

function locate(stops: readonly TourStop[]): Result<LocatedStop[]> {
  const missing: string[] = [];
  const located: LocatedStop[] = [];
  for (const stop of stops) {
    const { location, serviceMinutes } = stop;
    if (location === null) missing.push(`stop ${stop.id}: location`);
    if (serviceMinutes === null) missing.push(`stop ${stop.id}: serviceMinutes`);
    if (location !== null && serviceMinutes !== null) located.push({ location, serviceMinutes, stop });
  }
  if (missing.length > 0) return needs(...missing);
  if (new Set(stops.map((stop) => stop.id)).size < stops.length) return outOfRange('stops', 'each id once');
  return success(located);
}

function checkStop({ location, serviceMinutes, stop }: LocatedStop): Failure | undefined {
  const { window } = stop;
  return firstFailure(
    checkPoint(`stop ${stop.id}`, location),
    within(`stop ${stop.id}: serviceMinutes`, serviceMinutes, 0, 1440),
    window && within(`stop ${stop.id}: window.fromMinute`, window.fromMinute, 0, 1440),
    window && within(`stop ${stop.id}: window.toMinute`, window.toMinute, window.fromMinute, 1440),
  );
}
