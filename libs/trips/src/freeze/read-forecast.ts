import { needs, outOfRange, type Result, success } from '@rimeward/units';
import { dateOfDay, type LocalDate } from '../calendar/local-date';
import { freezeKind, type FreezeKind } from './freeze-kind';
import { localDateOf, readZonedTime, type ZonedTime } from './forecast-time';

/** One hour of a forecast: ISO start with offset, and the air temperature, or null where it is missing. */
export interface ForecastHour {
  timeIso: string;
  temperatureF: number | null;
}

/** The first hour of a forecast at or below a threshold. */
export interface ForecastFreeze {
  timeIso: string;
  date: LocalDate;
  temperatureF: number;
  hoursAhead: number;
}

/** Lowest temperature of a day in a forecast, with the weather service's name for it. */
export interface ForecastLow {
  date: LocalDate;
  lowF: number;
  kind: FreezeKind;
}

/** What a forecast says about a threshold. */
export interface ForecastReading {
  firstFreeze: ForecastFreeze | null;
  /** First day that the forecast does not show to stay above the threshold until midnight, without a gap. */
  firstUnclearDate: LocalDate;
  lows: ForecastLow[];
  /** Hours listed without a temperature. */
  missingHours: string[];
}

interface ReadHour {
  time: ZonedTime;
  timeIso: string;
  temperatureF: number | null;
}

const hourMs = 3_600_000;
const dayMs = 24 * hourMs;

/**
 * Reads a forecast against a threshold, from `nowIso` on; earlier hours are left out. Every time needs its offset;
 * a forecast in UTC needs the site's `utcOffsetMinutes`, since the day of the freeze is a day on the wall clock.
 * Needs `forecast` when no hour is left; out of range for unreadable times and impossible temperatures.
 */
export function readForecast(
  hours: readonly ForecastHour[],
  thresholdF: number,
  nowIso: string,
  utcOffsetMinutes?: number,
): Result<ForecastReading> {
  const now = readZonedTime(nowIso, utcOffsetMinutes);
  if (!now) return outOfRange('nowIso', 'ISO time with offset');
  const read: ReadHour[] = [];
  for (const [at, { timeIso, temperatureF }] of hours.entries()) {
    const time = readZonedTime(timeIso, utcOffsetMinutes);
    if (!time) return outOfRange(`forecast[${at}].timeIso`, 'ISO time with offset');
    if (timeIso.endsWith('Z') && utcOffsetMinutes === undefined) return needs('utcOffsetMinutes');
    if (temperatureF !== null && !(temperatureF >= -80 && temperatureF <= 140))
      return outOfRange(`forecast[${at}].temperatureF`, '-80 to 140');
    if (time.utcMs > now.utcMs - hourMs) read.push({ time, timeIso, temperatureF });
  }
  if (!read.some((hour) => hour.temperatureF !== null)) return needs('forecast');
  read.sort((a, b) => a.time.utcMs - b.time.utcMs);
  return success({
    firstFreeze: firstFreeze(read, thresholdF, now),
    firstUnclearDate: firstUnclearDate(read, thresholdF, now),
    lows: lowsByDay(read),
    missingHours: read.filter((hour) => hour.temperatureF === null).map((hour) => hour.timeIso),
  });
}

function firstFreeze(hours: readonly ReadHour[], thresholdF: number, now: ZonedTime): ForecastFreeze | null {
  for (const { time, timeIso, temperatureF } of hours)
    if (temperatureF !== null && temperatureF <= thresholdF) {
      const hoursAhead = Math.max(0, (time.utcMs - now.utcMs) / hourMs);
      return { timeIso, date: localDateOf(time), temperatureF, hoursAhead };
    }
  return null;
}

/** Walks the unbroken run of hours above the threshold; the day on which it ends is the first unclear one. */
function firstUnclearDate(hours: readonly ReadHour[], thresholdF: number, now: ZonedTime): LocalDate {
  let clearUntil = now;
  for (const [at, { time, temperatureF }] of hours.entries()) {
    // A forecast made just now starts with the next full hour.
    const gap = time.utcMs > clearUntil.utcMs + (at === 0 ? hourMs : 0);
    if (gap || temperatureF === null || temperatureF <= thresholdF) break;
    clearUntil = { utcMs: time.utcMs + hourMs, localMs: time.localMs + hourMs };
  }
  return dateOfDay(Math.floor(clearUntil.localMs / dayMs));
}

function lowsByDay(hours: readonly ReadHour[]): ForecastLow[] {
  const lows = new Map<LocalDate, number>();
  for (const { time, temperatureF } of hours) {
    if (temperatureF === null) continue;
    const date = localDateOf(time);
    lows.set(date, Math.min(lows.get(date) ?? Infinity, temperatureF));
  }
  return [...lows].map(([date, lowF]) => ({ date, lowF, kind: freezeKind(lowF) }));
}
