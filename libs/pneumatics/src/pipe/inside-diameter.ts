import type { Result } from '@rimeward/units';
import { explain, type Explained } from '../explain/explanation';
import type { PipeRun } from './pipe-run';
import { sizeOf } from './size-of';

/**
 * Which bore a figure uses. Nominal (outside less two minimum walls) is the larger: more water held, so a later mist. Average (wall
 * at mid tolerance) is what most pipe has. Volumes use nominal, friction may use either.
 */
export type DiameterBasis = 'nominal' | 'average';

/** A bore and which of the two it is. */
export interface InsideDiameter extends Explained {
  insideDiameterIn: number;
  basis: DiameterBasis;
}

/** Inside diameter of a run. Needs its material; refuses a size that the material is not made in. */
export function insideDiameter(
  run: Pick<PipeRun, 'material' | 'nominalIn'>,
  basis: DiameterBasis = 'nominal',
): Result<InsideDiameter> {
  const size = sizeOf(run.material, run.nominalIn);
  if (!size.ok) return size;
  const { nominalInsideDiameterIn, averageInsideDiameterIn } = size.value;
  return {
    ok: true,
    value: {
      insideDiameterIn: basis === 'nominal' ? nominalInsideDiameterIn : averageInsideDiameterIn,
      basis,
      why: explain('inside-diameter', { material: run.material, nominalIn: run.nominalIn, basis }),
    },
  };
}
