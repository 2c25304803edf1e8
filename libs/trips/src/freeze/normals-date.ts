import { type Result, success } from '@rimeward/units';
import { dateInColdSeason } from '../calendar/cold-season';
import type { LocalDate } from '../calendar/local-date';
import {
  firstFreezeEntry,
  type FirstFreezeTable,
  type PublishedPercent,
  type ThresholdF,
} from './first-freeze-table';

/** Date of first freeze from the normals in a given cold season, or why they give none. */
export type NormalsDate =
  { kind: 'date'; date: LocalDate } | { kind: 'too-infrequent' } | { kind: 'year-round' };

/** The published day of first freeze, as a date in the cold season that starts in August of `startYear`. */
export function normalsDate(
  table: FirstFreezeTable,
  thresholdF: ThresholdF,
  percent: PublishedPercent,
  startYear: number,
): Result<NormalsDate> {
  const entry = firstFreezeEntry(table, thresholdF, percent);
  if (!entry.ok) return entry;
  if (entry.value.kind !== 'day') return success({ kind: entry.value.kind });
  return success({ kind: 'date', date: dateInColdSeason(startYear, entry.value.dayOfYear) });
}
