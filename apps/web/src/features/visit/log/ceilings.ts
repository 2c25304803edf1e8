import type { System } from '@rimeward/field-log';
import { plainCeiling } from '@rimeward/rules';
import type { ZoneCeiling } from './visit-log';

/** The ceiling of each zone by the rules that the office judges with; the weakest part is named. */
export function zoneCeilings(system: System, companyCapPsi: number | null): Record<string, ZoneCeiling> {
  return Object.fromEntries(
    system.zones.map((zone) => {
      const ceiling = plainCeiling(system, zone, companyCapPsi);
      const partName = ceiling.setBy === 'lowest-part' ? (zone.lowestRatedPart?.name ?? null) : null;
      return [zone.id, { ...ceiling, partName }];
    }),
  );
}
