import { success, within, type Result } from '@rimeward/units';
import { explain, type Assumption, type Explained } from '../explain/explanation';
import { familyOf } from './material';
import { checkRun, type PipeRun } from './pipe-run';
import { sizeOf } from './size-of';
import { temperatureFactor } from './temperature-factor';

/** Share of a rating that may be used where surge is not computed (USDA NRCS Missouri 1997, ASAE S376.1, published). */
export const surgeFactor = 0.72;

/** Pressure rating of an OD-controlled plastic pipe, psi: 2 S / (SDR - 1). S in psi, 2000 for PVC 1120 (published). */
export const ratingFromSdrPsi = (dimensionRatio: number, designStressPsi: number): number =>
  (2 * designStressPsi) / (dimensionRatio - 1);

/** Pressure rating of an ID-controlled plastic pipe, psi: 2 S / (SIDR + 1). */
export const ratingFromSidrPsi = (dimensionRatio: number, designStressPsi: number): number =>
  (2 * designStressPsi) / (dimensionRatio + 1);

/** What a run may carry at a temperature. */
export interface RunRating extends Explained {
  runId: string;
  /** Printed class or table value at 73 F (copper: soldered joint at 100 F), psi gauge; null where none is known. */
  ratedPsi: number | null;
  /** Share left at the temperature; null where the material is not rated that hot. */
  temperatureFactor: number | null;
  /** Rating x temperature x surge, psi gauge; 0 where not rated that hot; null where no rating is known. */
  limitPsi: number | null;
}

const cold: readonly Assumption[] = [{ field: 'airTemperatureF', value: 73, why: 'rated-for-cold-air' }];

/** Rating of a run at 73 F, psi: the class printed on it, else the table's; null where neither is known. */
export function ratedPsiOf(run: PipeRun): Result<number | null> {
  const impossible = checkRun(run);
  if (impossible) return impossible;
  if (run.material === 'unknown') return success(run.ratedPsi ?? null);
  const size = sizeOf(run.material, run.nominalIn, `${run.id}.nominalIn`);
  return size.ok ? success(run.ratedPsi ?? size.value.ratedPsi) : size;
}

/** What is left of a rating at a temperature and with surge, psi; 0 where the material is not rated that hot. */
export const deratedPsi = (run: PipeRun, ratedPsi: number, airTemperatureF: number | null): number =>
  ratedPsi * surgeFactor * (factorAt(run, airTemperatureF) ?? 0);

const factorAt = (run: PipeRun, airTemperatureF: number | null): number | null =>
  airTemperatureF === null ? 1 : temperatureFactor(familyOf(run.material), airTemperatureF, run.nominalIn);

/**
 * Rating of a run, derated for the air in it. `airTemperatureF` null: the rating at 73 F, said so under `assumed` and `missing`. A class
 * printed on the pipe comes before the table. Refuses impossible runs and temperatures outside -60 to 600 F.
 */
export function runRating(run: PipeRun, airTemperatureF: number | null): Result<RunRating> {
  const rated = ratedPsiOf(run);
  if (!rated.ok) return rated;
  const impossible = airTemperatureF === null ? null : within('airTemperatureF', airTemperatureF, -60, 600);
  if (impossible) return impossible;
  const ratedPsi = rated.value;
  return success({
    runId: run.id,
    ratedPsi,
    temperatureFactor: factorAt(run, airTemperatureF),
    limitPsi: ratedPsi === null ? null : deratedPsi(run, ratedPsi, airTemperatureF),
    why: explain(
      'pipe-rating',
      { material: run.material, nominalIn: run.nominalIn, ratedPsi, airTemperatureF, surgeFactor },
      airTemperatureF === null ? cold : [],
      airTemperatureF === null ? ['airTemperatureF'] : [],
    ),
  });
}
