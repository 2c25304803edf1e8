/** The calendar day of a moment in a time zone, YYYY-MM-DD. */
export function dayIn(timeZone: string, nowMs: number): string {
  const parts = new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  });
  return parts.format(nowMs);
}

/** The day so many days later; calendar days, free of daylight saving. */
export function dayShifted(day: string, days: number): string {
  const at = new Date(`${day}T12:00:00Z`);
  at.setUTCDate(at.getUTCDate() + days);
  return at.toISOString().slice(0, 10);
}
