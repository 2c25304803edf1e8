import { describe, expect, it } from 'vitest';
import fluids from '../../fixtures/fluids.json';
import { readCsv, sizeFromText, valueOf } from '../testing/fixtures';
import { insideDiameter } from './inside-diameter';
import type { Material } from './material';
import { nominalSizesIn, sizeOf } from './size-of';
import { galPerFtOfBore, waterHeld } from './water-held';

describe(`pipe dimensions agree with ${fluids.version} (independent reference; ASTM D1785, D2241, ASME B36.10)`, () => {
  for (const material of [...new Set(fluids.pipes.map((pipe) => pipe.material))] as Material[]) {
    it(`${material}, every size from 1/2 to 4 in`, () => {
      const pipes = fluids.pipes.filter((pipe) => pipe.material === material);
      expect(pipes).toHaveLength(9);
      for (const pipe of pipes) {
        const size = sizeOf(material, pipe.nominalIn);
        expect(size.ok, `${material} ${pipe.nominalIn}`).toBe(pipe.made);
        if (!size.ok) continue;
        // The package keeps steel to 0.01 mm, hence the thousandth.
        expect(Math.abs(size.value.nominalInsideDiameterIn - (pipe.insideDiameterIn ?? 0))).toBeLessThan(
          0.002,
        );
        expect(Math.abs(size.value.outsideDiameterIn - (pipe.outsideDiameterIn ?? 0))).toBeLessThan(0.002);
        expect(Math.abs(size.value.wallIn - (pipe.wallIn ?? 0))).toBeLessThan(0.002);
      }
    });
  }
});

describe('PVC bores', () => {
  const names: Record<string, Material> = {
    'PVC SCH40 D1785': 'pvc-sch40',
    'PVC SCH80 D1785': 'pvc-sch80',
    'PVC SDR13.5 (315 psi) D2241': 'pvc-sdr13.5',
    'PVC SDR21 (200 psi) D2241': 'pvc-sdr21',
    'PVC SDR26 (160 psi) D2241': 'pvc-sdr26',
    'PVC SDR32.5 (125 psi) D2241': 'pvc-sdr32.5',
  };
  const rows = readCsv('pvc_dimensions.csv');
  const published =
    Object.keys(rows[0] ?? {}).find((column) => column.startsWith('id_average_published')) ?? '';

  it('nominal bores and contents of 48 sizes (table of PVC dimensions, ASTM, published)', () => {
    expect(rows).toHaveLength(48);
    for (const row of rows) {
      const run = {
        material: names[row.pipe ?? ''] ?? 'unknown',
        nominalIn: sizeFromText(row.nominal_in ?? ''),
      };
      const { insideDiameterIn } = valueOf(insideDiameter(run));
      expect(insideDiameterIn).toBeCloseTo(Number(row['id_nominal_in(od-2*minwall)']), 3);
      expect(galPerFtOfBore(insideDiameterIn) * 100).toBeCloseTo(Number(row.gal_per_100ft_nominal), 2);
    }
  });
  it('average bores of Schedule 40 and 80 (sd-w.com and sizes.com, published)', () => {
    const known = rows.filter((row) => row[published] !== '');
    expect(known).toHaveLength(18);
    for (const row of known) {
      const run = {
        material: names[row.pipe ?? ''] ?? 'unknown',
        nominalIn: sizeFromText(row.nominal_in ?? ''),
      };
      const average = valueOf(insideDiameter(run, 'average'));
      expect(average.insideDiameterIn).toBe(Number(row[published]));
      expect(average.basis).toBe('average');
      expect(average.why.inputs).toMatchObject({ basis: 'average' });
    }
  });
  it('average bores of SDR pipe from the wall tolerance (derived)', () => {
    for (const row of rows.filter((one) => one[published] === '')) {
      const run = {
        material: names[row.pipe ?? ''] ?? 'unknown',
        nominalIn: sizeFromText(row.nominal_in ?? ''),
      };
      const average = valueOf(insideDiameter(run, 'average')).insideDiameterIn;
      expect(Math.abs(average - Number(row['id_average_in(minwall+tol/2)']))).toBeLessThan(0.0011);
    }
  });
});

describe('copper and polyethylene', () => {
  it('27 copper tubes K, L, M (ASTM B88: engineeringtoolbox d_779, published)', () => {
    const rows = readCsv('copper_b88.csv');
    expect(rows).toHaveLength(27);
    for (const row of rows) {
      const material = `copper-${(row.type ?? '').toLowerCase()}` as Material;
      const size = valueOf(sizeOf(material, sizeFromText(row.nominal_in ?? '')));
      expect(size.outsideDiameterIn).toBe(Number(row.od_in));
      expect(size.nominalInsideDiameterIn).toBeCloseTo(Number(row.id_in), 3);
      expect(galPerFtOfBore(size.nominalInsideDiameterIn) * 100).toBeCloseTo(Number(row.gal_per_100ft), 2);
    }
  });
  it('type L bores and contents (ASTM B88: piping-designer.com, published)', () => {
    for (const [nominalIn, boreIn, galPerFt] of [
      [0.5, 0.545, 0.0121],
      [0.75, 0.785, 0.0251],
      [1, 1.025, 0.0429],
      [1.25, 1.265, 0.0655],
      [1.5, 1.505, 0.0925],
      [2, 1.985, 0.161],
      [2.5, 2.465, 0.248],
      [3, 2.945, 0.354],
    ] as const) {
      const size = valueOf(sizeOf('copper-l', nominalIn));
      expect(size.nominalInsideDiameterIn).toBeCloseTo(boreIn, 3);
      expect(Math.abs(galPerFtOfBore(boreIn) / galPerFt - 1)).toBeLessThan(0.006);
    }
  });
  it('polyethylene bores are the same for every SIDR, walls at least 0.060 in (ASTM D2239, bores from memory)', () => {
    for (const row of readCsv('pe_d2239.csv')) {
      for (const ratio of ['7', '9', '11.5', '15', '19']) {
        const size = valueOf(sizeOf(`pe-sidr${ratio}` as Material, sizeFromText(row.nominal_in ?? '')));
        expect(size.nominalInsideDiameterIn).toBeCloseTo(Number(row.id_in), 3);
        expect(Math.abs(size.wallIn - Number(row[`min_wall_SIDR${ratio}`]))).toBeLessThan(0.0011);
      }
    }
  });
});

describe('water held', () => {
  it('contents of 100 ft by bore (The Farm and Garden Rule Book, published)', () => {
    for (const [boreIn, gal] of [
      [0.5, 1.02],
      [1, 4.08],
      [1.5, 9.18],
      [2, 16.32],
      [2.5, 25.5],
      [3, 36.72],
      [4, 65.28],
    ] as const) {
      expect(Math.abs(galPerFtOfBore(boreIn) * 100 - gal)).toBeLessThan(0.006);
    }
  });
  it('adds runs up: 300 ft of 1 in and 200 ft of 3/4 in Schedule 40 hold 13.469 and 5.540 gal (derived)', () => {
    const held = valueOf(
      waterHeld([
        { id: 'a', material: 'pvc-sch40', nominalIn: 1, lengthFt: 300 },
        { id: 'b', material: 'pvc-sch40', nominalIn: 0.75, lengthFt: 200 },
      ]),
    );
    expect(held.runs.map((run) => run.volumeGal.toFixed(3))).toEqual(['13.469', '5.540']);
    expect(held.totalGal).toBeCloseTo(19.009, 3);
    expect(held.why).toMatchObject({
      formulaId: 'water-held',
      assumed: [{ why: 'nominal-inside-diameter' }],
    });
  });
});

describe('what cannot be', () => {
  it('an unknown material is asked for, by run', () => {
    expect(waterHeld([{ id: 'main', material: 'unknown', nominalIn: 1, lengthFt: 10 }])).toEqual({
      ok: false,
      error: { kind: 'needs', fields: ['main.material'] },
    });
  });
  it('a size that a material is not made in names those it is', () => {
    expect(sizeOf('pvc-sdr26', 0.5)).toEqual({
      ok: false,
      error: { kind: 'out-of-range', field: 'nominalIn', range: '1, 1.25, 1.5, 2, 2.5, 3, 4' },
    });
    expect(nominalSizesIn('unknown')).toEqual([]);
  });
  it('a run of no or negative length names the run', () => {
    for (const lengthFt of [0, -5, Number.NaN, 20_001]) {
      const held = waterHeld([{ id: 'main', material: 'pvc-sch40', nominalIn: 1, lengthFt }]);
      expect(held).toMatchObject({ ok: false, error: { kind: 'out-of-range', field: 'main.lengthFt' } });
    }
  });
});
