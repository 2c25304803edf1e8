import { needs, outOfRange, type Result, success } from '@rimeward/units';
import { dayOfColdSeason } from '../calendar/cold-season';
import { dayOf365, isLocalDate, type LocalDate } from '../calendar/local-date';
import type { Explanation } from '../explain/explanation';
import {
  firstFreezeEntry,
  normalsElement,
  publishedPercents,
  type FirstFreezeTable,
  type ThresholdF,
} from './first-freeze-table';

/**
 * Chance, percent, that the first freeze of the cold season has come on or before a date. The published dates bound
 * it from both sides; `percent` is the straight line between two neighbours, and null where only one side is known
 * (before the earliest or after the latest published date): nothing is read beyond the table.
 */
export interface ChanceByDate {
  atLeastPercent: number;
  atMostPercent: number;
  percent: number | null;
  explanation: Explanation;
}

interface KnownPoint {
  percent: number;
  seasonDay: number;
}

/**
 * Chance of a first freeze at `thresholdF` on or before `date`, whatever happened so far this autumn.
 * Needs at least one published entry; refuses tables whose dates run backwards.
 */
export function chanceOfFreezeBy(
  table: FirstFreezeTable,
  thresholdF: ThresholdF,
  date: LocalDate,
): Result<ChanceByDate> {
  if (!isLocalDate(date)) return outOfRange('date', 'YYYY-MM-DD');
  const seasonDay = dayOfColdSeason(dayOf365(Number(date.slice(5, 7)), Number(date.slice(8, 10))));
  const points: KnownPoint[] = [];
  const missing: string[] = [];
  let ceiling = 100;
  for (const percent of publishedPercents) {
    const entry = firstFreezeEntry(table, thresholdF, percent);
    if (!entry.ok && entry.error.kind === 'out-of-range') return entry;
    if (!entry.ok) missing.push(normalsElement(thresholdF, percent));
    else if (entry.value.kind === 'year-round') points.push({ percent, seasonDay: 0 });
    else if (entry.value.kind === 'too-infrequent') ceiling = Math.min(ceiling, percent);
    else points.push({ percent, seasonDay: dayOfColdSeason(entry.value.dayOfYear) });
  }
  if (points.length === 0 && ceiling === 100) return needs(...missing);
  if (points.some((point, at) => at > 0 && point.seasonDay < (points[at - 1]?.seasonDay ?? 0)))
    return outOfRange(`T${thresholdF}F`, 'dates that grow later from 10 % to 90 %');
  return success({
    ...between(points, seasonDay, ceiling),
    explanation: {
      inputs: { station: table.station, period: table.period, thresholdF, date },
      assumed: [],
      missing,
      formulaId: 'freeze-chance-by-date',
      sourceIds: ['ncei-normals-1991-2020', 'ncei-supplemental-1981-2010', 'cold-season-august'],
    },
  });
}

function between(
  points: readonly KnownPoint[],
  seasonDay: number,
  ceiling: number,
): Pick<ChanceByDate, 'atLeastPercent' | 'atMostPercent' | 'percent'> {
  const before = points.findLast((point) => point.seasonDay <= seasonDay);
  const after = points.find((point) => point.seasonDay > seasonDay);
  const atLeastPercent = before?.percent ?? 0;
  const atMostPercent = after?.percent ?? ceiling;
  if (before?.seasonDay === seasonDay) return { atLeastPercent, atMostPercent, percent: before.percent };
  if (!before || !after) return { atLeastPercent, atMostPercent, percent: null };
  const share = (seasonDay - before.seasonDay) / (after.seasonDay - before.seasonDay);
  return {
    atLeastPercent,
    atMostPercent,
    percent: before.percent + share * (after.percent - before.percent),
  };
}
