import { gaugePsi, seaLevelPsia } from '@rimeward/units';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { openHeadsAir } from '../air-demand/open-heads';
import { off, valueOf } from '../testing/fixtures';
import { hoseBore, pipeBores } from './air-path';
import { heldPressure, type HeldPressureInput } from './held-pressure';
import type { Hose } from './hose';
import { hoseLoss } from './hose-loss';

const around = { atmospherePsia: seaLevelPsia, airTemperatureF: 70 };
const hose: Hose = { insideDiameterIn: 0.75, lengthFt: 50, couplings: 0 };

describe('loss along a hose', () => {
  it('3/4 in, 50 ft, 100 ft3/min, 80 psig: 4.95 psi (python3-fluids, independent reference), Harris 10.18 (published)', () => {
    const loss = valueOf(hoseLoss(hose, 100, gaugePsi(80), around));
    expect(off(loss.lossPsi, 4.951)).toBeLessThan(0.005);
    expect(off(loss.harrisLossPsi, 10.18)).toBeLessThan(0.005);
    expect(loss.outletPsi).toBeCloseTo(80 - loss.lossPsi, 9);
    expect(loss.warnings).toEqual([]);
  });
  it('1 in, 100 ft, 185 ft3/min, 80 psig: 7.665 psi (python3-fluids, independent reference)', () => {
    const loss = valueOf(
      hoseLoss({ insideDiameterIn: 1, lengthFt: 100, couplings: 0 }, 185, gaugePsi(80), around),
    );
    expect(off(loss.lossPsi, 7.665)).toBeLessThan(0.005);
  });
  it('couplings: 1.5 times smooth hose: 1 in, 100 ft, 100 ft3/min, 90 psi lose about 3.35 psi against 2.17 (common practice)', () => {
    const loss = valueOf(
      hoseLoss({ insideDiameterIn: 1, lengthFt: 100, couplings: 2 }, 100, gaugePsi(90), around),
    );
    expect(off(loss.smoothLossPsi, 2.17)).toBeLessThan(0.01);
    expect(off(loss.lossPsi, 3.35)).toBeLessThan(0.04);
    expect(loss.why.assumed.map(({ why }) => why)).toEqual(['smooth-hose', 'coupling-factor']);
  });
  it('warns over 10 % and over 40 % of the inlet pressure', () => {
    expect(valueOf(hoseLoss(hose, 185, gaugePsi(80), around)).warnings).toEqual(['large-drop']);
    const far = valueOf(hoseLoss({ ...hose, lengthFt: 200 }, 150, gaugePsi(80), around));
    expect(far.warnings).toContain('beyond-formula');
  });
  it('says where Harris leaves nothing', () => {
    const far = valueOf(hoseLoss({ ...hose, lengthFt: 200 }, 150, gaugePsi(80), around));
    expect(far.warnings).toContain('harris-leaves-nothing');
  });
  it('refuses a flow that the hose cannot pass, and impossible hoses, by name', () => {
    expect(hoseLoss({ ...hose, insideDiameterIn: 0.375 }, 185, gaugePsi(50), around)).toMatchObject({
      error: { field: 'freeAirCfm' },
    });
    expect(hoseLoss({ ...hose, lengthFt: -1 }, 10, gaugePsi(50), around)).toMatchObject({
      error: { field: 'hose.lengthFt' },
    });
    expect(hoseLoss({ ...hose, insideDiameterIn: 0 }, 10, gaugePsi(50), around)).toMatchObject({
      error: { field: 'hose.insideDiameterIn' },
    });
    expect(hoseLoss(hose, 10, gaugePsi(-16), around)).toMatchObject({ error: { field: 'inletPsi' } });
  });
});

describe('pressure held through dry heads', () => {
  const bores = valueOf(
    pipeBores([
      { id: 'main', material: 'pvc-sdr21', nominalIn: 1.5, lengthFt: 200 },
      { id: 'lateral', material: 'pe-sidr15', nominalIn: 1, lengthFt: 120 },
    ]),
  );
  const input: HeldPressureInput = {
    flowGpm: 15,
    designPressurePsi: 40,
    deliveredCfm: 185,
    regulatorPsi: gaugePsi(50),
    path: [hoseBore(hose, 1.5), ...bores],
  };
  const held = (change: Partial<HeldPressureInput> = {}) =>
    valueOf(heldPressure({ ...input, ...change }, around));

  it('a big compressor holds the regulator, and the heads get less than the gauge shows', () => {
    const big = held();
    expect(big).toMatchObject({ limitedBy: 'regulator', gaugePsi: 50 });
    expect(big.headPsi).toBeLessThan(50);
    expect(big.freeAirCfm).toBeLessThan(185);
  });
  it('the air through the heads is what their pressure passes (orifice, derived)', () => {
    for (const deliveredCfm of [20, 60, 185]) {
      const state = held({ deliveredCfm });
      const heads = valueOf(openHeadsAir(15, 40, gaugePsi(state.headPsi), around));
      expect(off(heads.freeAirCfm, state.freeAirCfm)).toBeLessThan(1e-4);
    }
  });
  it('a small compressor holds only what its air gives', () => {
    const small = held({ deliveredCfm: 18 });
    expect(small).toMatchObject({ limitedBy: 'compressor' });
    expect(small.freeAirCfm).toBeCloseTo(18, 6);
    expect(small.headPsi).toBeLessThan(15);
  });
  it('warns that the gauge at the compressor says little about the heads', () => {
    expect(held({ path: [hoseBore({ ...hose, lengthFt: 200 }, 1.5), ...bores] }).gaugeMeaning).toBe(
      'far-above-the-heads',
    );
    expect(held({ path: [] })).toMatchObject({ gaugeMeaning: 'close-to-the-heads' });
    expect(held({ path: [] }).pathLossPsi).toBeCloseTo(0, 3);
  });
  it('never allows more at the gauge than the regulator, whatever the hose loses; more hose never helps the heads', () => {
    const figure = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(
        figure(1, 60),
        figure(10, 80),
        figure(5, 300),
        figure(5, 80),
        figure(5, 300),
        (gpm, design, air, psi, ft) => {
          const state = held({
            flowGpm: gpm,
            designPressurePsi: design,
            deliveredCfm: air,
            regulatorPsi: gaugePsi(psi),
            path: [hoseBore({ ...hose, lengthFt: ft }, 1.5), ...bores],
          });
          const longer = held({
            flowGpm: gpm,
            designPressurePsi: design,
            deliveredCfm: air,
            regulatorPsi: gaugePsi(psi),
            path: [hoseBore({ ...hose, lengthFt: ft * 1.5 }, 1.5), ...bores],
          });
          return (
            state.gaugePsi <= psi + 1e-6 &&
            state.headPsi <= state.gaugePsi + 1e-3 &&
            state.freeAirCfm <= air + 1e-6 &&
            longer.headPsi <= state.headPsi + 0.01
          );
        },
      ),
    );
  });
  it('refuses what cannot be, by name', () => {
    for (const [change, field] of [
      [{ flowGpm: 0 }, 'flowGpm'],
      [{ designPressurePsi: 0 }, 'designPressurePsi'],
      [{ deliveredCfm: 0 }, 'deliveredCfm'],
      [{ regulatorPsi: gaugePsi(-1) }, 'regulatorPsi'],
    ] as const) {
      expect(heldPressure({ ...input, ...change }, around)).toMatchObject({ error: { field } });
    }
  });
  it('asks for the material of unknown pipe', () => {
    expect(pipeBores([{ id: 'x', material: 'unknown', nominalIn: 1, lengthFt: 5 }])).toMatchObject({
      error: { kind: 'needs', fields: ['x.material'] },
    });
  });
});
