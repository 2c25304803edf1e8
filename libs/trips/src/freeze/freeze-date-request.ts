import type { FirstFreezeTable, PublishedPercent } from './first-freeze-table';
import type { ForecastHour } from './read-forecast';

/** What the freeze date of a site is found from. Left-out choices are assumed and listed in the explanation. */
export interface FreezeDateRequest {
  /** Now, ISO with offset; its day on the wall clock is today. */
  nowIso: string;
  normals?: FirstFreezeTable;
  /** Hourly temperatures; an empty list counts as none. */
  forecast?: readonly ForecastHour[];
  /** Minutes east of UTC of the site, where the forecast is not written in the site's own time. */
  utcOffsetMinutes?: number;
  /** Air temperature, F, at or below which the system must be dry. 32 is assumed. */
  thresholdF?: number;
  /** How many F colder the site gets than the station and the forecast. 0 is assumed. */
  colderByF?: number;
  /** Chance, percent, one is willing to take that the first freeze comes earlier. 10 is assumed. */
  riskPercent?: PublishedPercent;
  /** Whole days to keep free before the freeze. 0 is assumed. */
  marginDays?: number;
  /** Year in whose August the cold season starts. Assumed from today: from April on the coming autumn. */
  coldSeasonStartYear?: number;
}
