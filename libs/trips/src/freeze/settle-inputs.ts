import { outOfRange, type Result, success, within } from '@rimeward/units';
import { coldSeasonStartYear } from '../calendar/cold-season';
import type { LocalDate } from '../calendar/local-date';
import type { Assumption } from '../explain/explanation';
import { firstFailure } from '../explain/first-failure';
import { publishedPercents, thresholdsF, type PublishedPercent, type ThresholdF } from './first-freeze-table';
import type { FreezeDateRequest } from './freeze-date-request';

/** The choices behind a freeze date, each given or assumed. */
export interface SettledInputs {
  thresholdF: number;
  colderByF: number;
  /** The published threshold used with the normals: the next one at or above what the site needs. */
  normalsThresholdF: ThresholdF;
  riskPercent: PublishedPercent;
  marginDays: number;
  coldSeasonStartYear: number;
  assumed: Assumption[];
}

/** Fills in the choices that were left out, writes down why, and refuses impossible ones. */
export function settleInputs(request: FreezeDateRequest, today: LocalDate): Result<SettledInputs> {
  const assumed: Assumption[] = [];
  const settle = <T extends number>(field: string, given: T | undefined, value: T, why: string): T => {
    if (given !== undefined) return given;
    assumed.push({ field, value, why });
    return value;
  };
  const thresholdF = settle('thresholdF', request.thresholdF, 32, 'the trade acts at 32 F');
  const colderByF = settle(
    'colderByF',
    request.colderByF,
    0,
    'the site is taken to be as cold as the station',
  );
  const riskPercent = settle('riskPercent', request.riskPercent, 10, 'one autumn in ten freezes earlier');
  const marginDays = settle('marginDays', request.marginDays, 0, 'no day kept free before the freeze');
  const startYear = settle(
    'coldSeasonStartYear',
    request.coldSeasonStartYear,
    coldSeasonStartYear(today),
    'the cold season that is running or comes next',
  );
  const refused = firstFailure(
    within('thresholdF', thresholdF, 10, 36),
    within('colderByF', colderByF, 0, 20),
    within('marginDays', marginDays, 0, 60),
    Number.isInteger(marginDays) ? undefined : outOfRange('marginDays', 'whole days'),
    within('coldSeasonStartYear', startYear, 1900, 2200),
    publishedPercents.includes(riskPercent)
      ? undefined
      : outOfRange('riskPercent', publishedPercents.join(', ')),
  );
  if (refused) return refused;
  const normalsThresholdF = thresholdsF.find((published) => published >= thresholdF + colderByF);
  if (normalsThresholdF === undefined) return outOfRange('thresholdF + colderByF', 'at most 36');
  return success({
    thresholdF,
    colderByF,
    normalsThresholdF,
    riskPercent,
    marginDays,
    coldSeasonStartYear: startYear,
    assumed,
  });
}
