/** Day of the calendar as YYYY-MM-DD. */
export type Day = string;

/** The calendar day that it is at this instant in a time zone. */
export function dayIn(zone: string, instant: Date): Day {
  // Canadian English writes dates as ISO 8601 does.
  return new Intl.DateTimeFormat('en-CA', { timeZone: zone }).format(instant);
}

export function addDays(day: Day, days: number): Day {
  const date = new Date(`${day}T12:00:00Z`);
  date.setUTCDate(date.getUTCDate() + days);
  return date.toISOString().slice(0, 10);
}

/** The instant at which a clock on the wall in this time zone shows this day and minute. */
export function instantAt(day: Day, minuteOfDay: number, zone: string): Date {
  const asIfUtc = Date.parse(`${day}T00:00:00Z`) + minuteOfDay * 60_000;
  const offset = offsetMs(zone, new Date(asIfUtc));
  return new Date(asIfUtc - offsetMs(zone, new Date(asIfUtc - offset)));
}

function offsetMs(zone: string, instant: Date): number {
  const parts = new Intl.DateTimeFormat('en-US', {
    timeZone: zone,
    hourCycle: 'h23',
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: 'numeric',
    minute: 'numeric',
    second: 'numeric',
  }).formatToParts(instant);
  const read = (type: string): number => Number(parts.find((part) => part.type === type)?.value);
  const shown = Date.UTC(
    read('year'),
    read('month') - 1,
    read('day'),
    read('hour'),
    read('minute'),
    read('second'),
  );
  return shown - Math.floor(instant.getTime() / 1_000) * 1_000;
}
