import { familyOf } from '../pipe/material';
import type { PipeRun } from '../pipe/pipe-run';
import { ratedPsiOf, surgeFactor } from '../pipe/rating';
import { hottestForFactor } from '../pipe/temperature-factor';

/**
 * The hottest air that does not lower a ceiling, F: at it every run's derated rating still reaches `ceilingPsi`. null where no run minds
 * heat; 73 F where a run's cold rating is itself the limit.
 */
export function hottestWithoutLowering(runs: readonly PipeRun[], ceilingPsi: number): number | null {
  let hottestF = Infinity;
  for (const run of runs) {
    const rated = ratedPsiOf(run);
    if (!rated.ok) continue;
    const family = familyOf(run.material);
    const ratedPsi = rated.value;
    // Without a rating only the end of the material's table counts.
    const factor = ratedPsi === null ? 0 : Math.min(1, ceilingPsi / (ratedPsi * surgeFactor));
    hottestF = Math.min(hottestF, hottestForFactor(family, factor, run.nominalIn));
  }
  return hottestF === Infinity ? null : hottestF;
}
