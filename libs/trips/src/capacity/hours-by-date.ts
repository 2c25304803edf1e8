import type { LocalDate } from '../calendar/local-date';
import type { SeasonCrew } from './capacity-request';
import type { PlaceableVisit } from './place-visits';

/** Work due by a date against the crews' time until then, both from today on. */
export interface HoursByDate {
  date: LocalDate;
  visitsDue: number;
  minutesDue: number;
  minutesAvailable: number;
  /** Time to spare; below 0 no plan whatsoever can be in time. */
  minutesToSpare: number;
}

/** For each last day among the visits, everything due by then against all crew time until then. */
export function hoursByDate(
  visits: readonly PlaceableVisit[],
  crews: readonly SeasonCrew[],
  today: LocalDate,
): HoursByDate[] {
  const dates = new Set(visits.map((visit) => visit.lastDate).filter((date) => date !== null));
  return [...dates].sort().map((date) => {
    const due = visits.filter((visit) => visit.lastDate !== null && visit.lastDate <= date);
    const minutesDue = due.reduce((sum, visit) => sum + visit.minutes, 0);
    const minutesAvailable = minutesBetween(crews, today, date);
    return {
      date,
      visitsDue: due.length,
      minutesDue,
      minutesAvailable,
      minutesToSpare: minutesAvailable - minutesDue,
    };
  });
}

/** All crew time from one day to another, both counted; without an end when `to` is null. */
export function minutesBetween(crews: readonly SeasonCrew[], from: LocalDate, to: LocalDate | null): number {
  let sum = 0;
  for (const crew of crews)
    for (const { date, minutes } of crew.days)
      if (date >= from && (to === null || date <= to)) sum += minutes;
  return sum;
}
