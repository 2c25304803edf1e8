import { needs, outOfRange, type Result, success } from '@rimeward/units';
import { dateOfDay, dayNumber, type LocalDate } from '../calendar/local-date';
import type { Explanation } from '../explain/explanation';
import { chanceOfFreezeBy, type ChanceByDate } from './chance-by-date';
import type { FreezeDateRequest } from './freeze-date-request';
import { warningWindowHours } from './freeze-kind';
import { localDateOf, readZonedTime } from './forecast-time';
import { normalsDate, type NormalsDate } from './normals-date';
import { readForecast, type ForecastFreeze, type ForecastLow } from './read-forecast';
import { settleInputs, type SettledInputs } from './settle-inputs';

/** What decided the date. */
export type FreezeDateSetBy = 'forecast' | 'normals' | 'end-of-forecast' | 'year-round' | 'too-infrequent';

/**
 * How close the freeze is: its date has passed; the forecast has it within the 36 h in which freeze warnings are
 * issued; the forecast has it later; only the normals give a date; or no date at all.
 */
export type FreezeRisk = 'past' | 'within-36-h' | 'in-forecast' | 'in-season' | 'no-date';

/** The freeze date of a site, the last day to finish, and what they rest on. */
export interface FreezeDateToBeat {
  freezeDate: LocalDate | null;
  /** Last day on which the work still comes before the freeze, less the margin. */
  finishBy: LocalDate | null;
  /** Days from today to `finishBy`, both counted; 0 or less when it has passed. */
  daysLeft: number | null;
  setBy: FreezeDateSetBy;
  risk: FreezeRisk;
  firstFreezeInForecast: ForecastFreeze | null;
  forecastLows: ForecastLow[];
  /** Chance of a first freeze on or before `freezeDate` from the normals, or null without them. */
  chance: Omit<ChanceByDate, 'explanation'> | null;
  explanation: Explanation;
}

/**
 * The date by which a site's system must be dry. A freeze in the forecast sets it; otherwise the date of the normals
 * at the accepted risk, moved behind the days that the forecast shows to stay clear. Needs normals or a forecast with
 * a freeze in it: a mild forecast alone gives no date.
 */
export function freezeDateToBeat(request: FreezeDateRequest): Result<FreezeDateToBeat> {
  const now = readZonedTime(request.nowIso, request.utcOffsetMinutes);
  if (!now) return outOfRange('nowIso', 'ISO time with offset');
  const today = localDateOf(now);
  const settled = settleInputs(request, today);
  if (!settled.ok) return settled;
  const inputs = settled.value;
  const forecast = readForecast(
    request.forecast ?? [],
    inputs.thresholdF + inputs.colderByF,
    request.nowIso,
    request.utcOffsetMinutes,
  );
  if (!forecast.ok && !(forecast.error.kind === 'needs' && forecast.error.fields.includes('forecast')))
    return forecast;
  const normals = request.normals
    ? normalsDate(request.normals, inputs.normalsThresholdF, inputs.riskPercent, inputs.coldSeasonStartYear)
    : needs('normals');
  if (!normals.ok && normals.error.kind === 'out-of-range') return normals;
  const missing = [
    ...(normals.ok || normals.error.kind !== 'needs' ? [] : normals.error.fields),
    ...(forecast.ok ? forecast.value.missingHours.map((hour) => `forecast ${hour}`) : ['forecast']),
  ];
  const firstFreeze = forecast.ok ? forecast.value.firstFreeze : null;
  if (!normals.ok && !firstFreeze) return needs(...missing);

  const chosen = choose(
    firstFreeze,
    normals.ok ? normals.value : null,
    today,
    forecast.ok ? forecast.value.firstUnclearDate : null,
  );
  const chance =
    request.normals && chosen.freezeDate !== null
      ? chanceOfFreezeBy(request.normals, inputs.normalsThresholdF, chosen.freezeDate)
      : null;
  if (chance && !chance.ok && chance.error.kind === 'out-of-range') return chance;
  return success({
    ...chosen,
    ...deadline(chosen.freezeDate, today, inputs.marginDays),
    risk: riskOf(chosen.freezeDate, today, firstFreeze, chosen.setBy),
    firstFreezeInForecast: firstFreeze,
    forecastLows: forecast.ok ? forecast.value.lows : [],
    chance: chance?.ok ? withoutExplanation(chance.value) : null,
    explanation: explain(request, inputs, today, missing),
  });
}

interface Choice {
  freezeDate: LocalDate | null;
  setBy: FreezeDateSetBy;
}

function choose(
  freeze: ForecastFreeze | null,
  normals: NormalsDate | null,
  today: LocalDate,
  firstUnclear: LocalDate | null,
): Choice {
  const fromNormals = behindForecast(normals, today, firstUnclear);
  if (freeze && (!fromNormals?.freezeDate || freeze.date <= fromNormals.freezeDate))
    return { freezeDate: freeze.date, setBy: 'forecast' };
  return fromNormals ?? { freezeDate: null, setBy: 'too-infrequent' };
}

function behindForecast(
  normals: NormalsDate | null,
  today: LocalDate,
  firstUnclear: LocalDate | null,
): Choice | null {
  if (!normals) return null;
  if (normals.kind === 'too-infrequent') return { freezeDate: null, setBy: 'too-infrequent' };
  if (normals.kind === 'year-round') return { freezeDate: firstUnclear ?? today, setBy: 'year-round' };
  return firstUnclear !== null && firstUnclear > normals.date
    ? { freezeDate: firstUnclear, setBy: 'end-of-forecast' }
    : { freezeDate: normals.date, setBy: 'normals' };
}

function deadline(
  freezeDate: LocalDate | null,
  today: LocalDate,
  marginDays: number,
): Pick<FreezeDateToBeat, 'finishBy' | 'daysLeft'> {
  const freezeDay = freezeDate === null ? undefined : dayNumber(freezeDate);
  const todayDay = dayNumber(today);
  if (freezeDay === undefined || todayDay === undefined) return { finishBy: null, daysLeft: null };
  const finishDay = freezeDay - 1 - marginDays;
  return { finishBy: dateOfDay(finishDay), daysLeft: finishDay - todayDay + 1 };
}

function riskOf(
  freezeDate: LocalDate | null,
  today: LocalDate,
  freeze: ForecastFreeze | null,
  setBy: FreezeDateSetBy,
): FreezeRisk {
  if (freeze && freeze.hoursAhead <= warningWindowHours.to) return 'within-36-h';
  if (freezeDate === null) return 'no-date';
  if (freezeDate < today) return 'past';
  return setBy === 'forecast' ? 'in-forecast' : 'in-season';
}

function withoutExplanation({
  atLeastPercent,
  atMostPercent,
  percent,
}: ChanceByDate): FreezeDateToBeat['chance'] {
  return { atLeastPercent, atMostPercent, percent };
}

function explain(
  request: FreezeDateRequest,
  inputs: SettledInputs,
  today: LocalDate,
  missing: string[],
): Explanation {
  return {
    inputs: {
      today,
      station: request.normals?.station ?? null,
      period: request.normals?.period ?? null,
      thresholdF: inputs.thresholdF,
      colderByF: inputs.colderByF,
      normalsThresholdF: inputs.normalsThresholdF,
      riskPercent: inputs.riskPercent,
      marginDays: inputs.marginDays,
      coldSeasonStartYear: inputs.coldSeasonStartYear,
      forecastHours: request.forecast?.length ?? 0,
    },
    assumed: inputs.assumed,
    missing,
    formulaId: 'freeze-date-to-beat',
    sourceIds: [
      'ncei-normals-1991-2020',
      'ncei-supplemental-1981-2010',
      'nws-frost-freeze-maps',
      'nws-warning-criteria',
      'nws-hourly-forecast',
      'act-at-32f',
      'one-year-in-ten',
      'cold-season-august',
    ],
  };
}
