import { needs, outOfRange, type Result, success } from '@rimeward/units';

/** Temperatures, F, for which the climate normals publish a date of first freeze. */
export const thresholdsF = [16, 20, 24, 28, 32, 36] as const;
export type ThresholdF = (typeof thresholdsF)[number];

/** Chances, percent, for which the climate normals publish a date. */
export const publishedPercents = [10, 20, 30, 40, 50, 60, 70, 80, 90] as const;
export type PublishedPercent = (typeof publishedPercents)[number];

/**
 * Dates of first freeze at a station: by threshold and chance, the day of a 365-day year on or before which the
 * first freeze of the cold season comes with that chance. 10 % is the early date, one autumn in ten.
 * The special values of the normals stay as published: -9999 missing, -6666 too infrequent to give a date,
 * -4444 freezes the year round.
 */
export interface FirstFreezeTable {
  station: string;
  period: string;
  days: { [threshold in ThresholdF]?: { [percent in PublishedPercent]?: number | null } };
}

/** A published entry: a day of a 365-day year, or one of the two reasons for having none. */
export type FirstFreezeEntry =
  { kind: 'day'; dayOfYear: number } | { kind: 'too-infrequent' } | { kind: 'year-round' };

const missingValue = -9999;
const tooInfrequent = -6666;
const yearRound = -4444;

/** Name of an element in the climate normals, such as `ANN-TMIN-PRBFST-T32FP10`. */
export const normalsElement = (thresholdF: ThresholdF, percent: PublishedPercent): string =>
  `ANN-TMIN-PRBFST-T${thresholdF}FP${percent}`;

/** Builds a table from a station's row of the normals, keyed by element name. Other elements are ignored. */
export function tableFromNormals(
  station: string,
  period: string,
  row: Readonly<Record<string, number | null | undefined>>,
): FirstFreezeTable {
  const days: FirstFreezeTable['days'] = {};
  for (const thresholdF of thresholdsF)
    for (const percent of publishedPercents) {
      const value = row[normalsElement(thresholdF, percent)];
      if (value !== undefined && value !== null) (days[thresholdF] ??= {})[percent] = value;
    }
  return { station, period, days };
}

/**
 * One entry of a table. Needs the element when it is absent or published as missing; out of range when it is neither
 * a day from 1 to 365 nor a special value of the normals.
 */
export function firstFreezeEntry(
  table: FirstFreezeTable,
  thresholdF: ThresholdF,
  percent: PublishedPercent,
): Result<FirstFreezeEntry> {
  const value = table.days[thresholdF]?.[percent];
  const element = normalsElement(thresholdF, percent);
  if (value === undefined || value === null || value === missingValue) return needs(element);
  if (value === tooInfrequent) return success({ kind: 'too-infrequent' });
  if (value === yearRound) return success({ kind: 'year-round' });
  if (!Number.isInteger(value) || value < 1 || value > 365) return outOfRange(element, '1 to 365');
  return success({ kind: 'day', dayOfYear: value });
}
