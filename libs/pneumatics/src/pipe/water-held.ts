import { galPerFt3, success, type Result } from '@rimeward/units';
import { explain, type Assumption, type Explained } from '../explain/explanation';
import type { DiameterBasis } from './inside-diameter';
import { checkRun, type PipeRun } from './pipe-run';
import { sizeOf } from './size-of';

/** Water in one run. */
export interface RunWater {
  runId: string;
  insideDiameterIn: number;
  volumeGal: number;
}

/** Water in some runs and their sum. */
export interface WaterHeld extends Explained {
  runs: readonly RunWater[];
  totalGal: number;
}

/** Contents of a bore, gal per ft: (pi/4) d^2 x 12 / 231. */
export const galPerFtOfBore = (insideDiameterIn: number): number =>
  (Math.PI * insideDiameterIn * insideDiameterIn * galPerFt3) / (4 * 144);

const nominalBore: readonly Assumption[] = [
  { field: 'insideDiameter', value: 'nominal', why: 'nominal-inside-diameter' },
];

/**
 * Water that full runs hold, run by run, gal. Needs the material of each run; refuses lengths and sizes that cannot be, naming the run.
 * Source: geometry, held against the table of contents by bore of The Farm and Garden Rule Book (published).
 */
export function waterHeld(runs: readonly PipeRun[], basis: DiameterBasis = 'nominal'): Result<WaterHeld> {
  const held: RunWater[] = [];
  let totalGal = 0;
  for (const run of runs) {
    const impossible = checkRun(run);
    if (impossible) return impossible;
    const size = sizeOf(run.material, run.nominalIn, `${run.id}.nominalIn`);
    if (!size.ok) return size;
    const insideDiameterIn =
      basis === 'nominal' ? size.value.nominalInsideDiameterIn : size.value.averageInsideDiameterIn;
    const volumeGal = galPerFtOfBore(insideDiameterIn) * run.lengthFt;
    totalGal += volumeGal;
    held.push({ runId: run.id, insideDiameterIn, volumeGal });
  }
  const inputs = { runs: runs.length, basis };
  return success({
    runs: held,
    totalGal,
    why: explain('water-held', inputs, basis === 'nominal' ? nominalBore : []),
  });
}
