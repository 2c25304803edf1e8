import { above, success, within, type Failure, type Result } from '@rimeward/units';
import { explain, type Assumption, type Explained } from '../explain/explanation';
import { familyOf } from '../pipe/material';
import type { PipeRun } from '../pipe/pipe-run';
import { deratedPsi, ratedPsiOf } from '../pipe/rating';
import type { CeilingCandidate, CeilingKind, RatedPart } from './candidate';
import { ceilingPolicies, policyPsi, type CeilingPolicyId } from './policies';

/** The highest gauge pressure allowed and what sets it. */
export interface PressureCeiling extends Explained {
  /** psi gauge; 0 where the air is hotter than a pipe on its way is rated for. */
  pressurePsi: number;
  setBy: CeilingKind;
  /** The ceiling if the air were cooled to 73 F, psi gauge. */
  coldPressurePsi: number;
  /** All limits, lowest first. */
  candidates: readonly CeilingCandidate[];
}

/** Everything on the way of the air, from the air connection to the last head. */
export interface CeilingInput {
  runs: readonly PipeRun[];
  parts: readonly RatedPart[];
  policyId?: CeilingPolicyId;
  companyCapPsi: number | null;
  /** Temperature of the air that enters the pipe, F; null: not derated for heat, and said so. */
  airTemperatureF: number | null;
}

/**
 * The least of policy by material, derated pipe rating, lowest rated part and company cap. Refuses impossible runs, parts and caps.
 * Sources: csu-80-50 (second-hand) or the policy named, ratings and derating as in `runRating`, lowest part (derived).
 */
export function pressureCeiling(input: CeilingInput): Result<PressureCeiling> {
  const { runs, parts, companyCapPsi, airTemperatureF } = input;
  const impossible =
    checkParts(parts) ??
    (companyCapPsi === null ? null : above('companyCapPsi', companyCapPsi, 0, 150)) ??
    (airTemperatureF === null ? null : within('airTemperatureF', airTemperatureF, -60, 600));
  if (impossible) return impossible;
  const policyId = input.policyId ?? 'extension';
  const candidates: CeilingCandidate[] = policyCandidates(runs, policyId);
  for (const run of runs) {
    const rated = ratedPsiOf(run);
    if (!rated.ok) return rated;
    const rating = ratingCandidate(run, rated.value, airTemperatureF, ceilingPolicies[policyId].unknownPsi);
    if (rating) candidates.push(rating);
  }
  for (const { name, ratedPsi } of parts) {
    candidates.push(flat('lowest-part', ratedPsi, name, 'lowest-rated-part'));
  }
  if (companyCapPsi !== null)
    candidates.push(flat('company-cap', companyCapPsi, 'company', 'lowest-rated-part'));
  candidates.sort((a, b) => a.limitPsi - b.limitPsi);
  const [lowest] = candidates;
  if (!lowest) throw new Error('a policy always gives a candidate');
  return success({
    pressurePsi: lowest.limitPsi,
    setBy: lowest.kind,
    coldPressurePsi: candidates.reduce((least, one) => Math.min(least, one.coldLimitPsi), Infinity),
    candidates,
    why: explain(
      'pressure-ceiling',
      { policyId, runs: runs.length, parts: parts.length, companyCapPsi, airTemperatureF },
      assumedOf(input),
      missingOf(input),
    ),
  });
}

/** The derated rating of a run. Pipe that nobody knows, and that may be plastic, forbids air too hot for plastic. */
function ratingCandidate(
  run: PipeRun,
  ratedPsi: number | null,
  airTemperatureF: number | null,
  unknownPsi: number,
): CeilingCandidate | null {
  if (ratedPsi === null) {
    const tooHot = run.material === 'unknown' && deratedPsi(run, 1, airTemperatureF) === 0;
    return tooHot ? ofRun(run, 0, unknownPsi) : null;
  }
  return ofRun(run, deratedPsi(run, ratedPsi, airTemperatureF), deratedPsi(run, ratedPsi, null));
}

const ofRun = (run: PipeRun, limitPsi: number, coldLimitPsi: number): CeilingCandidate => ({
  kind: 'pipe-rating',
  limitPsi,
  subject: run.id,
  coldLimitPsi,
  sourceId: 'nrcs-surge',
});

/** One candidate for each kind of pipe on the way; an empty path counts as unknown pipe. */
function policyCandidates(runs: readonly PipeRun[], policyId: CeilingPolicyId): CeilingCandidate[] {
  const policy = ceilingPolicies[policyId];
  const found: CeilingCandidate[] = [];
  const add = (kind: CeilingKind, family: ReturnType<typeof familyOf>): void => {
    if (found.some((one) => one.kind === kind)) return;
    found.push(flat(kind, policyPsi(policy, family), policyId, policy.sourceId));
  };
  for (const run of runs) {
    const family = familyOf(run.material);
    add(family === 'polyethylene' ? 'polyethylene' : family === 'unknown' ? 'unknown' : 'rigid-pvc', family);
  }
  if (runs.length === 0) add('unknown', 'unknown');
  return found;
}

const flat = (
  kind: CeilingKind,
  limitPsi: number,
  subject: string,
  sourceId: CeilingCandidate['sourceId'],
): CeilingCandidate => ({ kind, limitPsi, coldLimitPsi: limitPsi, subject, sourceId });

function checkParts(parts: readonly RatedPart[]): Failure | null {
  for (const { name, ratedPsi } of parts) {
    const impossible = within(`${name}.ratedPsi`, ratedPsi, 1, 2_000);
    if (impossible) return impossible;
  }
  return null;
}

const defaultPolicy: Assumption = { field: 'policyId', value: 'extension', why: 'default-policy' };
const coldAir: Assumption = { field: 'airTemperatureF', value: 73, why: 'rated-for-cold-air' };
const steel: Assumption = { field: 'ratedPsi', value: null, why: 'galvanized-as-policy' };

function assumedOf({ policyId, runs, airTemperatureF }: CeilingInput): Assumption[] {
  const assumed: Assumption[] = [];
  if (policyId === undefined) assumed.push(defaultPolicy);
  if (airTemperatureF === null) assumed.push(coldAir);
  if (runs.some((run) => run.material === 'galvanized')) assumed.push(steel);
  return assumed;
}

function missingOf({ runs, airTemperatureF }: CeilingInput): string[] {
  const missing: string[] = [];
  if (airTemperatureF === null) missing.push('airTemperatureF');
  if (runs.length === 0) missing.push('runs');
  for (const run of runs) if (run.material === 'unknown') missing.push(`${run.id}.material`);
  return missing;
}
