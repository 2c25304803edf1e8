import type { LocalDate } from '../calendar/local-date';
import type { SeasonCrew } from './capacity-request';

/** A visit whose minutes and last day are known. `lastDate` is null when no freeze is expected. */
export interface PlaceableVisit {
  id: string;
  /** Work and driving. */
  minutes: number;
  lastDate: LocalDate | null;
  earliestDate: LocalDate | null;
  crewIds: readonly string[] | null;
}

/** A visit given to a crew on a day. */
export interface PlacedVisit {
  visitId: string;
  crewId: string;
  date: LocalDate;
}

/** True when a crew may do a visit at all. */
export const mayDo = (visit: PlaceableVisit, crewId: string): boolean =>
  visit.crewIds?.includes(crewId) ?? true;

/**
 * Fills crew days from the first on, each with the visits whose last day comes earliest (earliest-due-date) and that
 * still fit into the day. A visit is done by one crew on one day. Gives a plan that keeps every date and every day's
 * hours; what is left over may, at the edge, still fit in a cleverer packing.
 */
export function placeVisits(
  visits: readonly PlaceableVisit[],
  crews: readonly SeasonCrew[],
  today: LocalDate,
): PlacedVisit[] {
  const waiting = [...visits].sort(byUrgency);
  const crewDays = crews
    .flatMap((crew) => crew.days.map((day) => ({ crewId: crew.id, ...day })))
    .filter((day) => day.date >= today)
    .sort((a, b) => compare(a.date, b.date) || compare(a.crewId, b.crewId));
  const placed: PlacedVisit[] = [];
  for (const { crewId, date, minutes } of crewDays) {
    let left = minutes;
    for (let at = 0; at < waiting.length && left > 0;) {
      const visit = waiting[at];
      if (visit && visit.minutes <= left && isOpen(visit, date) && mayDo(visit, crewId)) {
        placed.push({ visitId: visit.id, crewId, date });
        left -= visit.minutes;
        waiting.splice(at, 1);
      } else at++;
    }
  }
  return placed;
}

function isOpen(visit: PlaceableVisit, date: LocalDate): boolean {
  return (
    (visit.earliestDate === null || visit.earliestDate <= date) &&
    (visit.lastDate === null || date <= visit.lastDate)
  );
}

/** Earliest last day first; then visits that few crews can do, long ones, and by id so that plans repeat. */
function byUrgency(a: PlaceableVisit, b: PlaceableVisit): number {
  return (
    compare(a.lastDate ?? '9999', b.lastDate ?? '9999') ||
    (a.crewIds?.length ?? Infinity) - (b.crewIds?.length ?? Infinity) ||
    b.minutes - a.minutes ||
    compare(a.id, b.id)
  );
}

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
