import { describe, expect, it } from 'vitest';
import { readCsv, valueOf } from '../testing/fixtures';
import { noiseDose, permittedHours } from './noise-dose';

describe('noise of a day (29 CFR 1910.95 App. A)', () => {
  it('51 rows of table G-16a, to the rounding of the table (29 CFR 1910.95 App. A, published)', () => {
    const rows = readCsv('osha_g16a.csv');
    expect(rows).toHaveLength(51);
    for (const row of rows) {
      const hours = permittedHours(Number(row.dBA));
      expect(Math.abs(hours - Number(row.T_hours_formula))).toBeLessThan(6e-5);
      const decimals = row.T_hours_table?.split('.')[1]?.length ?? 0;
      expect(Math.abs(hours - Number(row.T_hours_table))).toBeLessThanOrEqual(0.51 * 10 ** -decimals);
    }
  });
  it('2 h at 100, 1 h at 95, 5 h at 80 dBA: 140.625 %, 92.459 dBA (29 CFR 1910.95 App. A formulas, published)', () => {
    const dose = valueOf(
      noiseDose([
        { levelDba: 100, hours: 2 },
        { levelDba: 95, hours: 1 },
        { levelDba: 80, hours: 5 },
      ]),
    );
    expect(dose.dosePercent).toBeCloseTo(140.625, 9);
    expect(dose.timeWeightedAverageDba).toBeCloseTo(92.459, 3);
    expect(dose.reachesActionLevel).toBe(true);
  });
  it('3 h at 95 and 5 h at 85 dBA: 106.25 %, 90.437 dBA (29 CFR 1910.95 App. A formulas, published)', () => {
    const dose = valueOf(
      noiseDose([
        { levelDba: 95, hours: 3 },
        { levelDba: 85, hours: 5 },
      ]),
    );
    expect(dose.dosePercent).toBeCloseTo(106.25, 9);
    expect(dose.timeWeightedAverageDba).toBeCloseTo(90.437, 3);
  });
  it('8 h at 85 dBA are 50 %, the action level (29 CFR 1910.95, published)', () => {
    const dose = valueOf(noiseDose([{ levelDba: 85, hours: 8 }]));
    expect(dose.dosePercent).toBeCloseTo(50, 9);
    expect(dose.timeWeightedAverageDba).toBeCloseTo(85, 2);
    expect(dose.reachesActionLevel).toBe(true);
  });
  it('quiet counts for nothing, and a day has 24 hours', () => {
    expect(valueOf(noiseDose([{ levelDba: 70, hours: 8 }]))).toMatchObject({
      dosePercent: 0,
      timeWeightedAverageDba: null,
      reachesActionLevel: false,
    });
    expect(
      noiseDose([
        { levelDba: 90, hours: 20 },
        { levelDba: 90, hours: 5 },
      ]),
    ).toMatchObject({
      error: { field: 'hours' },
    });
    expect(noiseDose([{ levelDba: 200, hours: 1 }])).toMatchObject({ error: { field: 'levelDba' } });
  });
});
