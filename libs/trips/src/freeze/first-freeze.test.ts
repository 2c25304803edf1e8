import { describe, expect, it } from 'vitest';
import { dayOfColdSeason } from '../calendar/cold-season';
import { dayOfMonthName, monthName, readCsv } from '../testing/fixtures';
import { chanceOfFreezeBy } from './chance-by-date';
import { firstFreezeEntry, normalsElement, tableFromNormals } from './first-freeze-table';
import { freezeKind } from './freeze-kind';
import { normalsDate } from './normals-date';

const quoted = readCsv('first_freeze_normals_1991_2020_secondhand.csv');
const tableOf = (row: Record<string, string>): ReturnType<typeof tableFromNormals> =>
  tableFromNormals(row['station'] ?? '', '1991-2020', {
    'ANN-TMIN-PRBFST-T32FP10': dayOfMonthName(row['first_32F_p10'] ?? ''),
    'ANN-TMIN-PRBFST-T32FP50': dayOfMonthName(row['first_32F_p50'] ?? ''),
    'ANN-TMIN-PRBFST-T28FP50': dayOfMonthName(row['first_28F_p50'] ?? ''),
  });
const denver = tableOf(quoted.find((row) => row['station'] === 'Denver') ?? {});

describe('first freeze of the climate normals', () => {
  it('names elements as the NCEI description of the 1991-2020 files does (published): ANN-TMIN-PRBFST-T32FP10', () => {
    expect(normalsElement(32, 10)).toBe('ANN-TMIN-PRBFST-T32FP10');
  });

  for (const row of quoted)
    it(`reads ${row['station']} as quoted from the 1991-2020 normals (second-hand): P10 ${row['first_32F_p10']}, P50 ${row['first_32F_p50']}`, () => {
      const table = tableOf(row);
      for (const [thresholdF, percent, column] of [
        [32, 10, 'first_32F_p10'],
        [32, 50, 'first_32F_p50'],
        [28, 50, 'first_28F_p50'],
      ] as const) {
        const date = normalsDate(table, thresholdF, percent, 2026);
        expect(date.ok && date.value.kind === 'date' && monthName(date.value.date)).toBe(row[column]);
      }
      const [p10, p50, hard] = ['first_32F_p10', 'first_32F_p50', 'first_28F_p50'].map((column) =>
        dayOfMonthName(row[column] ?? ''),
      );
      expect(p10).toBeLessThan(p50 ?? 0);
      expect(p50).toBeLessThan(hard ?? 0);
    });

  it('puts the middle date of Denver within a day of the average of the High Plains center (published): October 7', () => {
    const average = readCsv('first_32F_hprcc.csv').find((row) => row['station'] === 'Denver CO')?.['average'];
    expect(average).toBe('Oct 7');
    expect(Math.abs((denver.days[32]?.[50] ?? 0) - dayOfMonthName(average ?? ''))).toBeLessThanOrEqual(1);
  });

  it('reads -9999 as missing, -6666 as too infrequent, -4444 as the year round (published, readme-supp.txt, part V)', () => {
    const table = tableFromNormals('a station', '1991-2020', {
      'ANN-TMIN-PRBFST-T32FP10': -9999,
      'ANN-TMIN-PRBFST-T16FP90': -6666,
      'ANN-TMIN-PRBFST-T36FP10': -4444,
      'ANN-TMIN-PRBFST-T28FP20': 290,
      'ANN-TMIN-NORMAL': 281,
    });
    expect(firstFreezeEntry(table, 32, 10)).toEqual({
      ok: false,
      error: { kind: 'needs', fields: ['ANN-TMIN-PRBFST-T32FP10'] },
    });
    expect(firstFreezeEntry(table, 32, 20)).toMatchObject({ error: { kind: 'needs' } });
    expect(firstFreezeEntry(table, 16, 90)).toEqual({ ok: true, value: { kind: 'too-infrequent' } });
    expect(firstFreezeEntry(table, 36, 10)).toEqual({ ok: true, value: { kind: 'year-round' } });
    expect(firstFreezeEntry(table, 28, 20)).toEqual({ ok: true, value: { kind: 'day', dayOfYear: 290 } });
  });

  it('refuses days that no year has', () => {
    for (const day of [0, 366, 281.5, -1])
      expect(firstFreezeEntry({ ...denver, days: { 32: { 10: day } } }, 32, 10)).toMatchObject({
        error: { kind: 'out-of-range', range: '1 to 365' },
      });
  });
});

describe('chance of a first freeze by a date', () => {
  const chance = (date: string): (number | null)[] => {
    const found = chanceOfFreezeBy(denver, 32, date);
    if (!found.ok) throw new Error(JSON.stringify(found.error));
    return [found.value.atLeastPercent, found.value.percent, found.value.atMostPercent];
  };

  it('is the published chance on the published date, and lies between neighbours on the days between', () => {
    expect(chance('2026-09-25')).toEqual([10, 10, 50]);
    expect(chance('2026-10-08')).toEqual([50, 50, 100]);
    const [atLeast, percent, atMost] = chance('2026-10-01');
    expect([atLeast, atMost]).toEqual([10, 50]);
    expect(percent).toBeCloseTo(10 + (6 / 13) * 40, 9);
  });

  it('reads nothing beyond the table: before the first date at most its chance, after the last at least that', () => {
    expect(chance('2026-09-01')).toEqual([0, null, 10]);
    expect(chance('2026-12-01')).toEqual([50, null, 100]);
    expect(chance('2027-02-01')).toEqual([50, null, 100]);
  });

  it('grows from August to July and stays within 0 to 100', () => {
    let before = 0;
    for (let day = 0; day < 365; day++) {
      const dayOfYear = ((day + 212) % 365) + 1;
      expect(dayOfColdSeason(dayOfYear)).toBe(day);
      const date = normalsDate({ ...denver, days: { 32: { 10: dayOfYear } } }, 32, 10, 2026);
      if (!date.ok || date.value.kind !== 'date') throw new Error('no date');
      const [atLeast, percent, atMost] = chance(date.value.date) as [number, number | null, number];
      expect(atLeast).toBeLessThanOrEqual(percent ?? atLeast);
      expect(percent ?? atMost).toBeLessThanOrEqual(atMost);
      expect(percent ?? atLeast).toBeGreaterThanOrEqual(before);
      before = percent ?? atLeast;
    }
  });

  it('stops at the chance above which the normals call a freeze too infrequent', () => {
    const mild = {
      station: 'a mild place',
      period: '1991-2020',
      days: { 32: { 10: 350, 20: 15, 30: -6666, 40: -6666 } },
    };
    expect(chanceOfFreezeBy(mild, 32, '2027-03-01')).toMatchObject({
      value: { atLeastPercent: 20, atMostPercent: 30 },
    });
    expect(chanceOfFreezeBy(mild, 32, '2027-01-02')).toMatchObject({
      value: { atLeastPercent: 10, atMostPercent: 20 },
    });
  });

  it('needs at least one entry, and refuses dates that run backwards', () => {
    expect(chanceOfFreezeBy(denver, 20, '2026-10-01')).toMatchObject({ error: { kind: 'needs' } });
    const backwards = { ...denver, days: { 32: { 10: 290, 20: 280 } } };
    expect(chanceOfFreezeBy(backwards, 32, '2026-10-01')).toMatchObject({
      error: { kind: 'out-of-range', field: 'T32F' },
    });
    expect(chanceOfFreezeBy(denver, 32, '2026-02-30')).toMatchObject({ error: { field: 'date' } });
  });
});

describe('kinds of cold night', () => {
  it('are frost to 36 F, freeze to 32 F, hard freeze to 28 F (published, weather.gov/jan/frostfreeze)', () => {
    expect([37, 36, 33, 32, 29, 28, 5].map(freezeKind)).toEqual([
      'none',
      'frost',
      'frost',
      'freeze',
      'freeze',
      'hard-freeze',
      'hard-freeze',
    ]);
  });
});
