import { above, within, type Failure } from '@rimeward/units';

/** A compressor as the company's equipment list has it. */
export interface Compressor {
  /** Rated free air, ft3/min. */
  freeAirCfm: number;
  maxPressurePsi: number;
  stages: 1 | 2;
  aftercooler: boolean;
  /** How the machine is cooled; without it, 60 ft3/min and more is taken for an oil-flooded screw. */
  cooling?: 'oil-flooded' | 'dry' | null;
  /** Temperature that the technician read at the outlet, F. */
  measuredDischargeF?: number | null;
}

/** Refuses a compressor that cannot be. */
export const checkCompressor = (compressor: Compressor): Failure | null =>
  above('compressor.freeAirCfm', compressor.freeAirCfm, 0, 5_000) ??
  within('compressor.maxPressurePsi', compressor.maxPressurePsi, 1, 500);
