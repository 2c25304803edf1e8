/** A calendar day without time or zone, as `YYYY-MM-DD`. */
export type LocalDate = string;

const dayMs = 86_400_000;
const shape = /^(\d{4})-(\d{2})-(\d{2})$/;

/** Whole days since 1970-01-01, or undefined when the text is not a day of the calendar. */
export function dayNumber(date: LocalDate): number | undefined {
  const parts = shape.exec(date);
  if (!parts) return undefined;
  const ms = Date.UTC(Number(parts[1]), Number(parts[2]) - 1, Number(parts[3]));
  return dateOfDay(ms / dayMs) === date ? ms / dayMs : undefined;
}

/** The day that lies `day` days after 1970-01-01. */
export function dateOfDay(day: number): LocalDate {
  return new Date(day * dayMs).toISOString().slice(0, 10);
}

/** True when the text is a day of the calendar. */
export const isLocalDate = (date: LocalDate): boolean => dayNumber(date) !== undefined;

const daysBeforeMonth = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334] as const;

/** Day of a 365-day year (January 1 is 1), the count used by climate normals; February 29 counts as March 1. */
export function dayOf365(month: number, day: number): number {
  if (month === 2 && day === 29) return 60;
  return (daysBeforeMonth[month - 1] ?? 0) + day;
}

/** Calendar date in `year` of a day of a 365-day year. */
export function dateOfDay365(year: number, dayOfYear: number): LocalDate {
  const month = daysBeforeMonth.findLastIndex((before) => before < dayOfYear);
  const day = dayOfYear - (daysBeforeMonth[month] ?? 0);
  return `${String(year).padStart(4, '0')}-${String(month + 1).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
}
