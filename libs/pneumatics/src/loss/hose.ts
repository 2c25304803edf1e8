import { above, within, type Failure } from '@rimeward/units';

/** The hose between compressor and air connection. */
export interface Hose {
  insideDiameterIn: number;
  lengthFt: number;
  /** Number of couplings; any at all raise the loss by the coupling factor. */
  couplings: number;
  /** Rated pressure read on the hose, psi gauge. */
  ratedPsi?: number | null;
  /** Outside diameter, in; bore plus 0.41 in is assumed without it. */
  outsideDiameterIn?: number | null;
}

/** Times the loss of smooth hose, when it has couplings (common practice). */
export const usualCouplingFactor = 1.5;

/** Refuses a hose that cannot be. */
export const checkHose = (hose: Hose): Failure | null =>
  within('hose.insideDiameterIn', hose.insideDiameterIn, 0.125, 6) ??
  above('hose.lengthFt', hose.lengthFt, 0, 2_000) ??
  within('hose.couplings', hose.couplings, 0, 100);
