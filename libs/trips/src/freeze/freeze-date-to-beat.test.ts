import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readText } from '../testing/fixtures';
import type { FreezeDateRequest } from './freeze-date-request';
import { freezeDateToBeat, type FreezeDateToBeat } from './freeze-date-to-beat';
import type { FirstFreezeTable } from './first-freeze-table';
import type { ForecastHour } from './read-forecast';

/** Denver as quoted from the 1991-2020 normals (second-hand): P10 September 25, P50 October 8, 28 F P50 October 18. */
const denver: FirstFreezeTable = {
  station: 'Denver',
  period: '1991-2020',
  days: { 32: { 10: 268, 50: 281 }, 28: { 50: 291 } },
};
/** Hourly forecast from a local time on, at -06:00. */
const hourly = (from: string, temperaturesF: readonly (number | null)[]): ForecastHour[] =>
  temperaturesF.map((temperatureF, hour) => {
    const local = new Date(Date.parse(`${from}:00Z`) + hour * 3_600_000).toISOString().slice(0, 19);
    return { timeIso: `${local}-06:00`, temperatureF };
  });
const mild = (hours: number): number[] => Array.from({ length: hours }, () => 55);
const dateOf = (request: FreezeDateRequest): FreezeDateToBeat => {
  const result = freezeDateToBeat(request);
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};

describe('freezeDateToBeat', () => {
  it('takes the date of one autumn in ten when there is no forecast, and says what is assumed and missing', () => {
    const result = dateOf({ nowIso: '2026-09-01T08:00:00-06:00', normals: denver });
    expect(result).toMatchObject({
      freezeDate: '2026-09-25',
      finishBy: '2026-09-24',
      daysLeft: 24,
      setBy: 'normals',
      risk: 'in-season',
      chance: { percent: 10, atLeastPercent: 10, atMostPercent: 50 },
    });
    expect(result.explanation.missing).toEqual(['forecast']);
    expect(result.explanation.assumed.map(({ field, value }) => [field, value])).toEqual([
      ['thresholdF', 32],
      ['colderByF', 0],
      ['riskPercent', 10],
      ['marginDays', 0],
      ['coldSeasonStartYear', 2026],
    ]);
  });

  it('keeps the margin free, and uses the risk and season it is given without assuming them', () => {
    const result = dateOf({
      nowIso: '2026-09-01T08:00:00-06:00',
      normals: denver,
      thresholdF: 32,
      colderByF: 0,
      riskPercent: 50,
      marginDays: 3,
      coldSeasonStartYear: 2027,
    });
    expect([result.freezeDate, result.finishBy]).toEqual(['2027-10-08', '2027-10-04']);
    expect(result.explanation.assumed).toEqual([]);
  });

  it('lets a freeze in the forecast set the date, on the day of the wall clock', () => {
    const forecast = hourly('2026-09-10T12:00', [...mild(59), 32, 31, ...mild(10)]);
    const result = dateOf({ nowIso: '2026-09-10T12:10:00-06:00', normals: denver, forecast });
    expect(result).toMatchObject({ freezeDate: '2026-09-12', finishBy: '2026-09-11', daysLeft: 2 });
    expect([result.setBy, result.risk]).toEqual(['forecast', 'in-forecast']);
    expect(result.firstFreezeInForecast).toMatchObject({
      timeIso: '2026-09-12T23:00:00-06:00',
      temperatureF: 32,
    });
    expect(result.forecastLows.find((low) => low.date === '2026-09-13')).toEqual({
      date: '2026-09-13',
      lowF: 31,
      kind: 'freeze',
    });
  });

  it('counts a freeze within 36 hours as inside the window of freeze warnings (published, NWS Blacksburg 2007)', () => {
    const at = (hour: number): string =>
      dateOf({
        nowIso: '2026-09-10T12:00:00-06:00',
        normals: denver,
        forecast: hourly('2026-09-10T12:00', [...mild(hour), 32]),
      }).risk;
    expect([at(36), at(37)]).toEqual(['within-36-h', 'in-forecast']);
  });

  it('moves a date of the normals behind the days a forecast shows to stay clear', () => {
    const forecast = hourly('2026-09-24T12:00', mild(7 * 24));
    const result = dateOf({ nowIso: '2026-09-24T12:00:00-06:00', normals: denver, forecast });
    expect([result.freezeDate, result.setBy]).toEqual(['2026-10-01', 'end-of-forecast']);
  });

  it('counts a forecast that starts with the next full hour as unbroken, one that starts later as not', () => {
    const after = (start: string): string | null =>
      dateOf({
        nowIso: '2026-09-28T11:20:00-06:00',
        normals: denver,
        forecast: hourly(start, mild(72)),
      }).freezeDate;
    expect([after('2026-09-28T12:00'), after('2026-09-28T13:00')]).toEqual(['2026-10-01', '2026-09-28']);
  });

  it('trusts no hour without a temperature: clear days end there, and the hour is listed as missing', () => {
    const forecast = hourly('2026-09-24T12:00', [...mild(40), null, ...mild(60)]);
    const result = dateOf({ nowIso: '2026-09-24T12:00:00-06:00', normals: denver, forecast });
    expect([result.freezeDate, result.setBy]).toEqual(['2026-09-26', 'end-of-forecast']);
    expect(result.explanation.missing).toEqual(['forecast 2026-09-26T04:00:00-06:00']);
  });

  it('ends the clear days at a gap between hours, but still sees a freeze behind it', () => {
    const forecast = [...hourly('2026-09-24T12:00', mild(40)), ...hourly('2026-09-28T00:00', [50, 30])];
    const result = dateOf({ nowIso: '2026-09-24T12:00:00-06:00', normals: denver, forecast });
    expect([result.freezeDate, result.setBy]).toEqual(['2026-09-26', 'end-of-forecast']);
    const without = dateOf({ nowIso: '2026-09-24T12:00:00-06:00', forecast });
    expect([without.freezeDate, without.setBy]).toEqual(['2026-09-28', 'forecast']);
    expect(without.explanation.missing).toEqual(['normals']);
  });

  it('says that the date has passed', () => {
    const result = dateOf({ nowIso: '2026-10-20T08:00:00-06:00', normals: denver });
    expect(result).toMatchObject({ freezeDate: '2026-09-25', risk: 'past' });
    expect(result.daysLeft).toBeLessThan(1);
  });

  it('acts earlier at a colder site: the next published temperature, and the forecast lowered', () => {
    const table = { ...denver, days: { ...denver.days, 36: { 10: 258 } } };
    const request = { nowIso: '2026-09-01T12:00:00-06:00', normals: table, colderByF: 2 };
    expect(dateOf(request).freezeDate).toBe('2026-09-15');
    const forecast = hourly('2026-09-01T12:00', [...mild(30), 34, 50]);
    expect(dateOf({ ...request, forecast }).freezeDate).toBe('2026-09-02');
    expect(freezeDateToBeat({ ...request, colderByF: 5 })).toMatchObject({ error: { kind: 'out-of-range' } });
  });

  it('gives no date where a freeze is too infrequent, and today where it freezes the year round', () => {
    const warm = { ...denver, days: { 32: { 10: -6666 } } };
    expect(dateOf({ nowIso: '2026-09-01T08:00:00-06:00', normals: warm })).toMatchObject({
      freezeDate: null,
      finishBy: null,
      daysLeft: null,
      setBy: 'too-infrequent',
      risk: 'no-date',
    });
    const cold = { ...denver, days: { 32: { 10: -4444 } } };
    expect(dateOf({ nowIso: '2026-09-01T08:00:00-06:00', normals: cold })).toMatchObject({
      freezeDate: '2026-09-01',
      setBy: 'year-round',
    });
  });

  it('needs what is missing: nothing at all, -9999, a mild forecast alone, a forecast gone by', () => {
    const nowIso = '2026-09-24T12:00:00-06:00';
    const neededFor = (request: Omit<FreezeDateRequest, 'nowIso'>): unknown => {
      const result = freezeDateToBeat({ nowIso, ...request });
      return !result.ok && result.error.kind === 'needs' && result.error.fields;
    };
    expect(neededFor({})).toEqual(['normals', 'forecast']);
    const gone = { ...denver, days: { 32: { 10: -9999 } } };
    expect(neededFor({ normals: gone })).toEqual(['ANN-TMIN-PRBFST-T32FP10', 'forecast']);
    expect(neededFor({ forecast: hourly('2026-09-24T12:00', mild(48)) })).toEqual(['normals']);
    expect(neededFor({ forecast: hourly('2026-09-20T12:00', [20, 20]) })).toEqual(['normals', 'forecast']);
    expect(
      neededFor({ normals: denver, forecast: [{ timeIso: '2026-09-24T19:00:00Z', temperatureF: 20 }] }),
    ).toEqual(['utcOffsetMinutes']);
  });

  it('reads a forecast in UTC on the wall clock of the site', () => {
    const forecast = [
      { timeIso: '2026-09-24T18:00:00Z', temperatureF: 40 },
      { timeIso: '2026-09-25T04:00:00+00:00', temperatureF: 30 },
    ];
    const result = dateOf({ nowIso: '2026-09-24T18:00:00Z', forecast, utcOffsetMinutes: -360 });
    expect(result.freezeDate).toBe('2026-09-24');
  });

  it('refuses impossible input and names it', () => {
    const ask = (request: Partial<FreezeDateRequest>): unknown =>
      freezeDateToBeat({ nowIso: '2026-09-24T12:00:00-06:00', normals: denver, ...request });
    expect(ask({ nowIso: '2026-09-24' })).toMatchObject({ error: { field: 'nowIso' } });
    expect(ask({ thresholdF: 40 })).toMatchObject({ error: { field: 'thresholdF' } });
    expect(ask({ marginDays: 1.5 })).toMatchObject({ error: { field: 'marginDays' } });
    expect(ask({ forecast: [{ timeIso: 'noon', temperatureF: 50 }] })).toMatchObject({
      error: { field: 'forecast[0].timeIso' },
    });
    expect(ask({ forecast: [{ timeIso: '2026-09-24T12:00:00-06:00', temperatureF: 300 }] })).toMatchObject({
      error: { field: 'forecast[0].temperatureF' },
    });
  });

  it('reads the documented shape of an hourly forecast (published, weather service API), reduced to plain hours', () => {
    const shape = JSON.parse(readText('forecast_shape_example.json')) as Record<
      string,
      { properties: { periods: { startTime: string; temperature: number }[] } }
    >;
    const periods = shape['GET /gridpoints/{office}/{x},{y}/forecast/hourly']?.properties.periods ?? [];
    const forecast = periods.map(({ startTime, temperature }) => ({
      timeIso: startTime,
      temperatureF: temperature,
    }));
    const result = dateOf({
      nowIso: '2026-10-06T18:00:00+00:00',
      utcOffsetMinutes: -360,
      normals: denver,
      forecast,
    });
    expect(result.forecastLows).toEqual([{ date: '2026-10-06', lowF: 58, kind: 'none' }]);
    expect(result.explanation.inputs['forecastHours']).toBe(1);
  });

  it('never gives a later date for a colder forecast, nor for a smaller risk', () => {
    const hours = fc.array(fc.integer({ min: 20, max: 60 }), { minLength: 1, maxLength: 160 });
    fc.assert(
      fc.property(hours, fc.integer({ min: 1, max: 10 }), (temperatures, colder) => {
        const ask = (temperaturesF: number[], riskPercent: 10 | 50): string => {
          const forecast = hourly('2026-09-22T12:00', temperaturesF);
          return (
            dateOf({ nowIso: '2026-09-22T12:00:00-06:00', normals: denver, forecast, riskPercent })
              .freezeDate ?? '9999'
          );
        };
        const base = ask(temperatures, 10);
        expect(
          ask(
            temperatures.map((temperature) => temperature - colder),
            10,
          ) <= base,
        ).toBe(true);
        expect(base <= ask(temperatures, 50)).toBe(true);
        expect(base >= '2026-09-22').toBe(true);
      }),
      { numRuns: 200 },
    );
  });
});
