import { above, type Failure } from '@rimeward/units';
import type { Material } from './material';

/** One run of pipe of one material and one nominal size. */
export interface PipeRun {
  id: string;
  material: Material;
  /** Nominal size, in: 0.5, 0.75, 1, 1.25, 1.5, 2, 2.5, 3 or 4. */
  nominalIn: number;
  lengthFt: number;
  /** Class printed on the pipe, psi at 73 F; null or absent where nobody has read it. */
  ratedPsi?: number | null;
}

/** Longest run that is taken for a run and not for a slip of the finger, ft. */
const longestFt = 20_000;
const highestRatedPsi = 2_000;

/** Refuses a length or a printed class that cannot be. The size is judged where a table is read. */
export function checkRun(run: PipeRun): Failure | null {
  return (
    above(`${run.id}.lengthFt`, run.lengthFt, 0, longestFt) ??
    (typeof run.ratedPsi === 'number' ? above(`${run.id}.ratedPsi`, run.ratedPsi, 0, highestRatedPsi) : null)
  );
}
