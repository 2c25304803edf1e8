import { dateOfDay365, dayOf365, type LocalDate } from './local-date';

/** August 1 in a 365-day year: first day of the cold season. */
export const coldSeasonFirstDay = dayOf365(8, 1);

/**
 * Days since August 1 of a day of a 365-day year, 0 to 364. Puts a first freeze in January after one in December.
 */
export function dayOfColdSeason(dayOfYear: number): number {
  return (dayOfYear - coldSeasonFirstDay + 365) % 365;
}

/** Calendar date of a day of a 365-day year within the cold season that starts in August of `startYear`. */
export function dateInColdSeason(startYear: number, dayOfYear: number): LocalDate {
  return dateOfDay365(dayOfYear >= coldSeasonFirstDay ? startYear : startYear + 1, dayOfYear);
}

/**
 * The cold season a day's work is planned for: the one that is running from August to March,
 * and the coming one from April on.
 */
export function coldSeasonStartYear(today: LocalDate): number {
  const year = Number(today.slice(0, 4));
  return Number(today.slice(5, 7)) <= 3 ? year - 1 : year;
}
