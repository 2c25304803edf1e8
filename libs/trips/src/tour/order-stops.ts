import { type Result, success } from '@rimeward/units';
import type { Explanation } from '../explain/explanation';
import type { RandomSource } from '../random/seeded-random';
import { placeDay, type DayPlaces } from './day-places';
import type { DayRequest } from './day-request';
import { scheduleOf, type DaySchedule } from './day-schedule';
import { shortestTour, type TourEnd } from './shortest-tour';
import { exactTimedOrder, exactTimedStops } from './timed/exact-timed-order';
import { searchTimedOrder } from './timed/search-timed-order';
import type { TimedDay } from './timed/timed-day';

/** A day's stops in order, its hours, and how they were found. */
export interface DayOrder extends DaySchedule {
  stopIds: string[];
  method: 'exact' | 'search';
  /** The same day in the order the stops were given in, for comparison. */
  asGiven: Pick<DaySchedule, 'travelMinutes' | 'lateMinutes' | 'finishMinute'>;
  explanation: Explanation;
}

/**
 * Puts a day's stops in order. Without time windows the least driving; with windows the least late, then the
 * shortest day with little driving. Exact for small days (13 places besides the yard, 9 stops with windows); beyond, a repeatable search that is never
 * worse than the order given. A window that cannot be kept is reported at its stop, never dropped.
 */
export function orderStops(request: DayRequest): Result<DayOrder> {
  const placed = placeDay(request);
  if (!placed.ok) return placed;
  const { day } = placed.value;
  const given = Array.from({ length: day.stops }, (_, at) => at + 1);
  const timed = request.stops.some((stop) => stop.window !== undefined);
  const driving = drivingOrder(placed.value, given, request.random);
  if (!driving.ok) return driving;
  const { order, method } = timed
    ? timedOrder(day, given, driving.value.order, request.random)
    : driving.value;
  const asGiven = scheduleOf(day, given, request.stops);
  return success({
    ...scheduleOf(day, order, request.stops),
    stopIds: order.map((place) => request.stops[place - 1]?.id ?? ''),
    method,
    asGiven: {
      travelMinutes: asGiven.travelMinutes,
      lateMinutes: asGiven.lateMinutes,
      finishMinute: asGiven.finishMinute,
    },
    explanation: explain(request, placed.value, timed),
  });
}

interface FoundOrder {
  order: number[];
  method: 'exact' | 'search';
}

function drivingOrder({ day, end }: DayPlaces, given: number[], random: RandomSource): Result<FoundOrder> {
  if (day.stops === 0) return success({ order: [], method: 'exact' });
  const elsewhere = typeof end === 'object';
  const tourEnd: TourEnd = elsewhere ? { at: day.stops + 1 } : end === 'yard' ? 'closed' : 'open';
  const whole = elsewhere ? [0, ...given, day.stops + 1] : [0, ...given];
  const tour = shortestTour(day.costs, { end: tourEnd, random, given: whole });
  if (!tour.ok) return tour;
  return success({ order: tour.value.order.slice(1, day.stops + 1), method: tour.value.method });
}

function timedOrder(day: TimedDay, given: number[], driving: number[], random: RandomSource): FoundOrder {
  if (day.stops <= exactTimedStops) return { order: exactTimedOrder(day), method: 'exact' };
  const closes = (place: number): number => day.closesMinute[place] as number;
  const byWindow = [...driving].sort((a, b) => (closes(a) === closes(b) ? 0 : closes(a) - closes(b)));
  return { order: searchTimedOrder(day, [given, driving, byWindow], random), method: 'search' };
}

function explain(request: DayRequest, { travel, end }: DayPlaces, timed: boolean): Explanation {
  const assumed = [...travel.assumed];
  if (request.end === undefined)
    assumed.push({ field: 'end', value: 'yard', why: 'the crew brings the compressor back' });
  return {
    inputs: {
      stops: request.stops.length,
      stopsWithWindow: request.stops.filter((stop) => stop.window !== undefined).length,
      departMinute: request.departMinute,
      end: typeof end === 'object' ? 'elsewhere' : end,
      roadFactor: travel.roadFactor,
      speedMph: travel.speedMph,
    },
    assumed,
    missing: [],
    formulaId: timed ? 'order-of-stops-with-windows' : 'order-of-stops-least-driving',
    sourceIds: ['held-karp-1962', 'croes-1958', 'or-1976', 'iugg-mean-radius', 'road-factor', 'town-speed'],
  };
}
