import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readCsv, sizeFromText, valueOf } from '../testing/fixtures';
import { materials, type Material } from './material';
import { ratingFromSdrPsi, ratingFromSidrPsi, runRating, surgeFactor } from './rating';
import { nominalSizesIn, sizeOf } from './size-of';
import { hottestForFactor, temperatureFactor } from './temperature-factor';

const run = (material: Material, nominalIn: number, ratedPsi: number | null = null) => ({
  id: 'run',
  material,
  nominalIn,
  lengthFt: 100,
  ratedPsi,
});

describe('ratings at 73 F', () => {
  it('2 S / (SDR - 1): 200, 160, 126.98, 320 psi (USDA NRCS via ajdesigner; Moser p. 206, published)', () => {
    expect(ratingFromSdrPsi(21, 2000)).toBe(200);
    expect(ratingFromSdrPsi(26, 2000)).toBe(160);
    expect(ratingFromSdrPsi(32.5, 2000)).toBeCloseTo(126.98, 2);
    expect(ratingFromSdrPsi(13.5, 2000)).toBe(320);
  });
  it('the class of SDR pipe is never above the formula by more than rounding (ASTM D2241, published)', () => {
    for (const [material, ratio] of [
      ['pvc-sdr13.5', 13.5],
      ['pvc-sdr21', 21],
      ['pvc-sdr26', 26],
      ['pvc-sdr32.5', 32.5],
    ] as const) {
      for (const nominalIn of nominalSizesIn(material)) {
        expect(valueOf(sizeOf(material, nominalIn)).ratedPsi).toBeLessThanOrEqual(
          ratingFromSdrPsi(ratio, 2000),
        );
      }
    }
  });
  it('Schedule 40 and 80, 18 sizes (PVC pipe data, published)', () => {
    const rows = readCsv('pvc_dimensions.csv').filter((row) => row.pipe?.includes('SCH'));
    for (const row of rows) {
      const material = row.pipe?.includes('SCH40') ? 'pvc-sch40' : 'pvc-sch80';
      const nominalIn = sizeFromText(row.nominal_in ?? '');
      expect(valueOf(runRating(run(material, nominalIn), 73)).ratedPsi).toBe(
        Number(row.rating_psi_73F_table),
      );
    }
  });
  it('Schedule ratings follow 2 S t / (OD - t) within 2.5 % (USDA NRCS, published)', () => {
    for (const material of ['pvc-sch40', 'pvc-sch80'] as const) {
      for (const nominalIn of nominalSizesIn(material)) {
        const { outsideDiameterIn, wallIn, ratedPsi } = valueOf(sizeOf(material, nominalIn));
        const formula = ratingFromSdrPsi(outsideDiameterIn / wallIn, 2000);
        expect(Math.abs(formula / (ratedPsi ?? 0) - 1)).toBeLessThan(0.025);
      }
    }
  });
  it('2 S / (SIDR + 1) at three stresses and the printed class (polyethylene, derived)', () => {
    for (const row of readCsv('pe_pressure_rating_formula.csv')) {
      const ratio = Number(row.SIDR);
      for (const stress of [630, 800, 1000]) {
        expect(ratingFromSidrPsi(ratio, stress)).toBeCloseTo(Number(row[`P_psi_S${stress}`]), 1);
      }
      const { ratedPsi } = valueOf(runRating(run(`pe-sidr${row.SIDR}` as Material, 1), 60));
      expect(ratedPsi).toBe(Number(row['nominal_class_PE3408(S=800)']));
    }
  });
  it('a class printed on the pipe comes before the table', () => {
    expect(valueOf(runRating(run('pe-sidr15', 1, 80), 60)).ratedPsi).toBe(80);
  });
  it('galvanized steel has no rating here, and unknown pipe only a printed one', () => {
    expect(valueOf(runRating(run('galvanized', 1), 60)).limitPsi).toBeNull();
    expect(valueOf(runRating(run('unknown', 1), 60)).limitPsi).toBeNull();
    expect(valueOf(runRating(run('unknown', 1, 100), 60)).limitPsi).toBeCloseTo(72, 9);
  });
  it('copper is as strong as its 50-50 joints, which are weaker than the tube (Copper Development Association and ASHRAE 2021, published)', () => {
    for (const row of readCsv('copper_cda.csv')) {
      for (const material of ['copper-k', 'copper-l', 'copper-m'] as const) {
        const rating = valueOf(runRating(run(material, Number(row.nominal_in)), 100));
        expect(rating.ratedPsi).toBe(Number(row.joint_50_50_100F_psi));
        expect(rating.ratedPsi).toBe(Number(row.joint_ashrae_100F_psi));
        expect(rating.ratedPsi).toBeLessThan(Number(row.type_m_annealed_100F_psi));
      }
    }
  });
});

describe('derating', () => {
  it('PVC at the printed temperatures, the safer of two printed sets (PPI Recommendation C and data pages, second-hand)', () => {
    const rows = readCsv('pvc_temperature_derating.csv').filter((row) => /^\d+$/.test(row.temp_F ?? ''));
    expect(rows).toHaveLength(11);
    for (const row of rows) {
      const printed = [row.factor_set_A, row.factor_set_B].filter((text) => text !== '').map(Number);
      expect(temperatureFactor('pvc', Number(row.temp_F), 1)).toBeCloseTo(Math.min(...printed), 9);
    }
  });
  it('230 psi at 120 F are 92 psi (printed example, published)', () => {
    expect(230 * (temperatureFactor('pvc', 120, 1) ?? 0)).toBeCloseTo(92, 9);
  });
  it('PVC is at half its rating near 109 F (Utah State lecture 21, published)', () => {
    expect(Math.abs(hottestForFactor('pvc', 0.5, 1) - 109)).toBeLessThanOrEqual(1.5);
  });
  it('above 140 F PVC is not rated at all (PPI Recommendation C, second-hand)', () => {
    expect(temperatureFactor('pvc', 140.1, 1)).toBeNull();
    expect(valueOf(runRating(run('pvc-sch40', 1), 141)).limitPsi).toBe(0);
  });
  it('polyethylene multipliers (AWWA M55 table 4-6, published)', () => {
    for (const row of readCsv('pe_temperature_multiplier_awwa.csv')) {
      expect(temperatureFactor('polyethylene', Number(row.max_temp_F), 1)).toBe(Number(row.multiplier));
    }
    expect(temperatureFactor('polyethylene', 101, 1)).toBeNull();
  });
  it('soldered joints at 150, 200 and 250 F (Copper Tube Handbook table 14.4a, published)', () => {
    for (const row of readCsv('copper_cda.csv')) {
      for (const hotF of [150, 200, 250]) {
        const factor = temperatureFactor('copper', hotF, Number(row.nominal_in)) ?? 0;
        expect(factor * Number(row.joint_50_50_100F_psi)).toBeCloseTo(Number(row[`joint_${hotF}F_psi`]), 9);
      }
      expect(temperatureFactor('copper', 251, Number(row.nominal_in))).toBeNull();
    }
  });
  it('72 % where surge is not computed: SDR 21 at 120 F leaves 57.6 psi, at 73 F 144 (USDA NRCS Missouri 1997, published)', () => {
    expect(surgeFactor).toBe(0.72);
    expect(valueOf(runRating(run('pvc-sdr21', 1), 120)).limitPsi).toBeCloseTo(57.6, 9);
    expect(valueOf(runRating(run('pvc-sdr21', 1), 73)).limitPsi).toBeCloseTo(144, 9);
  });
  it('SDR 26 at 110 F leaves 57.6 psi with the safer factor .50, 58.75 with .51 (second-hand)', () => {
    expect(valueOf(runRating(run('pvc-sdr26', 1), 110)).limitPsi).toBeCloseTo(57.6, 9);
    expect(160 * 0.51 * surgeFactor).toBeCloseTo(58.75, 2);
  });
  it('without a temperature the figure says that cold air was taken', () => {
    expect(valueOf(runRating(run('pvc-sdr21', 1), null)).why).toMatchObject({
      missing: ['airTemperatureF'],
      assumed: [{ why: 'rated-for-cold-air' }],
    });
  });
  it('never rises with temperature, for any pipe', () => {
    const made = materials.flatMap((material) =>
      nominalSizesIn(material).map((nominalIn) => ({ material, nominalIn })),
    );
    const temperature = fc.double({ min: -40, max: 300, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom(...made), temperature, temperature, ({ material, nominalIn }, a, b) => {
        const at = (hotF: number): number =>
          valueOf(runRating(run(material, nominalIn), hotF)).limitPsi ?? Infinity;
        return at(Math.max(a, b)) <= at(Math.min(a, b));
      }),
    );
  });
  it('the hottest temperature for a factor still leaves that factor', () => {
    fc.assert(
      fc.property(
        fc.constantFrom('pvc', 'polyethylene', 'copper', 'unknown' as const),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (family, factor) =>
          (temperatureFactor(family, hottestForFactor(family, factor, 1), 1) ?? 0) >= factor - 1e-9,
      ),
    );
  });
});
