import type { LocalDate } from '../calendar/local-date';
import type { SeasonCrew } from './capacity-request';
import { mayDo, type PlaceableVisit } from './place-visits';

/**
 * Why a visit has no day: an input is missing; its last day has passed; it cannot be done before its last day; no
 * crew that can do it works in time; it is longer than any such day; or all those hours went to visits due earlier.
 */
export type LeftReason =
  | 'needs-work-minutes'
  | 'needs-finish-by'
  | 'freeze-date-passed'
  | 'not-ready-before-freeze'
  | 'no-crew-in-time'
  | 'longer-than-any-day'
  | 'no-hours-left';

/** A visit that has no day. */
export interface LeftVisit {
  visitId: string;
  reason: LeftReason;
}

/** The reason for a visit that was not placed though its minutes and last day are known. */
export function reasonLeft(visit: PlaceableVisit, crews: readonly SeasonCrew[], today: LocalDate): LeftVisit {
  const { id: visitId, earliestDate, lastDate, minutes } = visit;
  if (earliestDate !== null && lastDate !== null && earliestDate > lastDate)
    return { visitId, reason: 'not-ready-before-freeze' };
  const from = earliestDate !== null && earliestDate > today ? earliestDate : today;
  const days = crews
    .filter((crew) => mayDo(visit, crew.id))
    .flatMap((crew) => crew.days)
    .filter(({ date, minutes: open }) => open > 0 && date >= from && (lastDate === null || date <= lastDate));
  if (days.length === 0) return { visitId, reason: 'no-crew-in-time' };
  if (days.every((day) => day.minutes < minutes)) return { visitId, reason: 'longer-than-any-day' };
  return { visitId, reason: 'no-hours-left' };
}
