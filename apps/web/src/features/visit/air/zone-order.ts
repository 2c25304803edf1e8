import type { System, Zone } from '@rimeward/field-log';

/**
 * Zones in working order: highest first, then farthest, then by number; zones without figures come last in their group.
 * Common practice, no source.
 */
export function zoneOrder(system: System): Zone[] {
  const known = (value: number | null) => value ?? Number.NEGATIVE_INFINITY;
  return [...system.zones].sort(
    (one, other) =>
      compare(known(other.elevationFt), known(one.elevationFt)) ||
      compare(known(other.distanceFt), known(one.distanceFt)) ||
      one.number - other.number,
  );
}

function compare(one: number, other: number): number {
  return one === other ? 0 : one < other ? -1 : 1;
}
