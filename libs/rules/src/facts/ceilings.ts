import type { System, Zone } from '@rimeward/field-log';

/** What sets a ceiling. */
export const ceilingSources = [
  'rigid-pvc',
  'polyethylene',
  'unknown',
  'lowest-part',
  'pipe-rating',
  'company-cap',
] as const;
export type CeilingSource = (typeof ceilingSources)[number];

export interface ZoneCeiling {
  pressurePsi: number;
  setBy: CeilingSource;
}

/** Highest gauge pressure for rigid pipe and for polyethylene, psi. */
const rigidPipePsi = 80;
const polyethylenePsi = 50;

/**
 * The plain ceiling of a zone, psi gauge: 80 for rigid pipe, 50 where any polyethylene lies on the path or the pipe is not
 * known; the company's cap and the lowest rated part of the zone where they are lower. The 80 and 50 are common practice and are
 * ascribed to Colorado State University Extension (seen second-hand). No derating: the physics library has the full ceiling.
 */
export function plainCeiling(system: System, zone: Zone | null, companyCapPsi: number | null): ZoneCeiling {
  const path = zone ? [...system.mainLine, ...zone.laterals] : system.mainLine;
  let ceiling: ZoneCeiling = { pressurePsi: rigidPipePsi, setBy: 'rigid-pvc' };
  if (path.length === 0 || path.some((run) => run.material === 'unknown')) {
    ceiling = { pressurePsi: polyethylenePsi, setBy: 'unknown' };
  }
  if (path.some((run) => run.material.startsWith('pe-'))) {
    ceiling = { pressurePsi: polyethylenePsi, setBy: 'polyethylene' };
  }
  const partPsi = zone?.lowestRatedPart?.ratedPsi ?? null;
  if (partPsi !== null && partPsi < ceiling.pressurePsi) {
    ceiling = { pressurePsi: partPsi, setBy: 'lowest-part' };
  }
  if (companyCapPsi !== null && companyCapPsi < ceiling.pressurePsi) {
    ceiling = { pressurePsi: companyCapPsi, setBy: 'company-cap' };
  }
  return ceiling;
}
