import { describe, expect, it } from 'vitest';
import { compressorFit, type FitInput } from './compressor-fit';

const good: FitInput = {
  deliveredCfm: 110,
  neededCfm: 12,
  planPsi: 50,
  liftPsi: 4,
  headPsi: 42,
  heldBy: 'regulator',
  headsPopUp: true,
  largestMainIn: 1.5,
};
const codes = (change: Partial<FitInput>): string[] =>
  compressorFit({ ...good, ...change }).reasons.map(({ code }) => code);

describe('a compressor against a zone', () => {
  it('suits when it has the air and the dry heads stay up (training slides 2013, published)', () => {
    const fit = compressorFit(good);
    expect(fit.verdict).toBe('suitable');
    expect(fit.reasons).toEqual([{ code: 'enough', params: { deliveredCfm: 110, neededCfm: 12 } }]);
  });
  it('is slow when dry heads drop, and says whether compressor or hose is to blame (threshold from memory)', () => {
    expect(compressorFit({ ...good, headPsi: 6, heldBy: 'compressor' }).verdict).toBe('slow');
    expect(codes({ headPsi: 6, heldBy: 'compressor' })).toEqual(['heads-drop']);
    expect(codes({ headPsi: 6, heldBy: 'regulator' })).toEqual(['hose-holds-back']);
    expect(codes({ headPsi: 6, headsPopUp: false })).toEqual(['enough']);
  });
  it('is slow with less air than the water asks for: air rides over it (Vinchesi 2012, published)', () => {
    expect(compressorFit({ ...good, neededCfm: 150 }).verdict).toBe('slow');
    expect(codes({ neededCfm: 150 })).toEqual(['less-air-than-water']);
  });
  it('is too small with less than half of it (common practice)', () => {
    expect(compressorFit({ ...good, neededCfm: 221 }).verdict).toBe('too-small');
    expect(codes({ neededCfm: 221 })).toEqual(['half-the-air']);
    expect(compressorFit({ ...good, neededCfm: 220 }).verdict).toBe('slow');
  });
  it('is too small when its pressure cannot lift the water over the highest head (62.4 lb/ft3, from memory)', () => {
    expect(codes({ liftPsi: 50 })).toEqual(['cannot-lift']);
    expect(compressorFit({ ...good, liftPsi: 49.9 }).verdict).toBe('suitable');
  });
  it('refuses shop compressors of one to three horsepower (common practice)', () => {
    expect(codes({ deliveredCfm: 11.9, neededCfm: 5 })).toEqual(['small-shop-compressor']);
    expect(compressorFit({ ...good, deliveredCfm: 12, neededCfm: 5 }).verdict).toBe('suitable');
  });
  it('puts the worst reason first', () => {
    expect(codes({ deliveredCfm: 5, neededCfm: 12, headPsi: 1, heldBy: 'compressor' })).toEqual([
      'small-shop-compressor',
      'half-the-air',
      'heads-drop',
    ]);
  });
  it('takes thresholds of the company', () => {
    const thresholds = { leastFreeAirCfm: 200, tooSmallRatio: 0.5, headsStayUpPsi: 15 };
    expect(compressorFit(good, thresholds).reasons[0]?.code).toBe('small-shop-compressor');
  });
  it('names the design pressure where the dry heads could not be judged', () => {
    expect(compressorFit({ ...good, headPsi: null, heldBy: null }).why.missing).toEqual([
      'designPressurePsi',
    ]);
  });
  it('stands beside the range of 80 to 100 ft3/min for mains up to 2 in (common practice; Greeley asks for 100, published)', () => {
    const standing = (deliveredCfm: number, largestMainIn: number | null): string =>
      compressorFit({ ...good, deliveredCfm, largestMainIn }).practice.standing;
    expect(standing(79.9, 2)).toBe('below');
    expect(standing(80, 2)).toBe('within');
    expect(standing(100, 1)).toBe('within');
    expect(standing(101, 1)).toBe('above');
    expect(standing(185, 2.5)).toBe('not-covered');
    expect(standing(185, null)).toBe('not-covered');
  });
});
