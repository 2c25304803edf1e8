import type { System } from '@rimeward/field-log';
import type { ZoneCeiling } from './visit-log';

const rigidPvcPsi = 80;
const polyethylenePsi = 50;

/**
 * The plain ceiling of each zone: 80 psi for rigid pipe, 50 psi where any polyethylene lies on the path, the weakest rated
 * part or the company's cap where they are lower. Source: Colorado State University as quoted second-hand, common practice.
 */
export function zoneCeilings(system: System, companyCapPsi: number | null): Record<string, ZoneCeiling> {
  const main = system.mainLine;
  return Object.fromEntries(
    system.zones.map((zone) => {
      const path = [...main, ...zone.laterals];
      const polyethylene = path.some((run) => run.material.startsWith('pe-'));
      const unknown = path.length === 0 || path.some((run) => run.material === 'unknown');
      const candidates: ZoneCeiling[] = [
        polyethylene || unknown
          ? { pressurePsi: polyethylenePsi, setBy: polyethylene ? 'polyethylene' : 'unknown', partName: null }
          : { pressurePsi: rigidPvcPsi, setBy: 'rigid-pvc', partName: null },
      ];
      if (zone.lowestRatedPart) {
        const { name, ratedPsi } = zone.lowestRatedPart;
        candidates.push({ pressurePsi: ratedPsi, setBy: 'lowest-part', partName: name });
      }
      if (companyCapPsi !== null)
        candidates.push({ pressurePsi: companyCapPsi, setBy: 'company-cap', partName: null });
      return [zone.id, candidates.reduce((low, one) => (one.pressurePsi < low.pressurePsi ? one : low))];
    }),
  );
}
