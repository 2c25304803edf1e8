import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import {
  chanceOfFreezeBy,
  freezeDateToBeat,
  greatCircleM,
  seasonCapacity,
  seededRandom,
  shortestTour,
  tableFromNormals,
  travelBetween,
  type FreezeDateRequest,
  type FreezeDateToBeat,
} from './index';
import { normalsDate } from './freeze/normals-date';
import { dayOfMonthName, monthName, readCsv } from './testing/fixtures';
import { tsplibCosts } from './testing/tsplib';
import type { Result } from '@rimeward/units';

const page = readFileSync(join(__dirname, '../../../docs/trips.md'), 'utf8');
/** Last cell of each row of the page's tables, by the id in its first. */
const figures = new Map(
  [...page.matchAll(/^\| ([A-Z]\d+)\s*\|.*\| ([^|]+?)\s*\|$/gm)].map((row) => [row[1] ?? '', row[2] ?? '']),
);

const have = <T>(result: Result<T>): T => {
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};
const denver = tableFromNormals('Denver', '1991-2020', {
  'ANN-TMIN-PRBFST-T32FP10': 268,
  'ANN-TMIN-PRBFST-T32FP50': 281,
  'ANN-TMIN-PRBFST-T28FP50': 291,
});
const firstFreeze = (thresholdF: 28 | 32, percent: 10 | 50): string => {
  const date = have(normalsDate(denver, thresholdF, percent, 2026));
  return date.kind === 'date' ? monthName(date.date) : date.kind;
};
const beat = (nowIso: string, more: Partial<FreezeDateRequest> = {}): FreezeDateToBeat =>
  have(freezeDateToBeat({ nowIso, normals: denver, ...more }));
const forecastFrom = (start: string, temperaturesF: number[]): FreezeDateRequest['forecast'] =>
  temperaturesF.map((temperatureF, hour) => ({
    timeIso: `${new Date(Date.parse(`${start}Z`) + hour * 3_600_000).toISOString().slice(0, 19)}-06:00`,
    temperatureF,
  }));
const mild = (hours: number): number[] => Array.from({ length: hours }, () => 55);

const places = {
  denver: { latitude: 39.7392, longitude: -104.9903 },
  springs: { latitude: 38.8339, longitude: -104.8214 },
  zero: { latitude: 0, longitude: 0 },
  oneNorth: { latitude: 1, longitude: 0 },
};
const toSprings = have(greatCircleM(places.denver, places.springs));
const oneDegree = have(greatCircleM(places.zero, places.oneNorth));

const season = have(
  seasonCapacity({
    today: '2026-10-01',
    visits: Array.from({ length: 20 }, (_, at) => ({
      id: `v${at}`,
      workMinutes: 40,
      finishBy: '2026-10-02',
    })),
    crews: [{ id: 'north', days: ['2026-10-01', '2026-10-02'].map((date) => ({ date, minutes: 480 })) }],
  }),
);

/** The length of the best of ten searches. */
function bestLength(name: string): number {
  const costs = tsplibCosts(name);
  const lengths = Array.from(
    { length: 10 },
    (_, seed) => have(shortestTour(costs, { end: 'closed', random: seededRandom(seed + 1) })).length,
  );
  return Math.min(...lengths);
}

const computed: Record<string, () => string> = {
  F1: () => firstFreeze(32, 10),
  F2: () => firstFreeze(32, 50),
  F3: () => firstFreeze(28, 50),
  F4: () => String(beat('2026-09-01T08:00:00-06:00').finishBy),
  F5: () => String(beat('2026-09-01T08:00:00-06:00').daysLeft),
  F6: () =>
    String(
      beat('2026-09-24T12:00:00-06:00', { forecast: forecastFrom('2026-09-24T12:00:00', mild(168)) })
        .freezeDate,
    ),
  F7: () =>
    String(
      beat('2026-09-10T12:00:00-06:00', { forecast: forecastFrom('2026-09-10T12:00:00', [...mild(59), 32]) })
        .freezeDate,
    ),
  F8: () => `${have(chanceOfFreezeBy(denver, 32, '2026-10-01')).percent?.toFixed(1)} %`,
  F9: () => {
    const average =
      readCsv('first_32F_hprcc.csv').find((row) => row['station'] === 'Denver CO')?.['average'] ?? '';
    return String(Math.abs((denver.days[32]?.[50] ?? 0) - dayOfMonthName(average)));
  },
  D1: () => `${toSprings.toFixed(3)} m`,
  D2: () => `${((toSprings / 101558.073 - 1) * 100).toFixed(3)} %`,
  D3: () => `${oneDegree.toFixed(3)} m`,
  D4: () => `${((oneDegree / 110574.389 - 1) * 100).toFixed(3)} %`,
  D5: () => `${have(travelBetween(places.denver, places.springs)).minutes.toFixed(1)} min`,
  T1: () => String(bestLength('burma14')),
  T2: () => String(bestLength('ulysses16')),
  T3: () => String(bestLength('eil51')),
  T4: () => String(bestLength('berlin52')),
  T5: () => String(bestLength('st70')),
  T6: () => String(bestLength('eil76')),
  T7: () => String(bestLength('kroA100')),
  C1: () => String(season.byDate[0]?.minutesDue),
  C2: () => String(season.byDate[0]?.minutesAvailable),
  C3: () => String(season.minutesShort),
  C4: () => String(season.crewDaysShort),
  C5: () => String(season.left.length),
};

describe('docs/trips.md', () => {
  it('has no figure in its tables that is not computed here, and the other way round', () => {
    expect([...figures.keys()].sort()).toEqual(Object.keys(computed).sort());
  });

  for (const [id, compute] of Object.entries(computed))
    it(`shows the computed figure ${id}`, () => {
      expect(figures.get(id)).toBe(compute());
    });
});
