import type { System } from '../system/system';
import type { VisitState } from '../visit/visit-state';

/** In the order in which the work sets them right. */
export const interlockIds = [
  'water-off',
  'pressure-relieved',
  'sensitive-parts',
  'backflow-closed',
  'connection-downstream',
  'couplings-pinned',
  'regulator-under-ceiling',
  'zone-open',
  'cautions-read',
  'people-clear',
] as const;
export type InterlockId = (typeof interlockIds)[number];

/** Interlocks that no reason can pass, because a person stands on the other side of them. */
const protecting: ReadonlySet<InterlockId> = new Set([
  'connection-downstream',
  'couplings-pinned',
  'cautions-read',
  'people-clear',
]);

export interface Interlock {
  id: InterlockId;
  satisfied: boolean;
  /** True: it cannot be passed with a reason. */
  protectsPeople: boolean;
  /** The reason with which somebody passed it; null when nobody did, or when it protects people. */
  passedBy: string | null;
}

export interface AirConditions {
  /** Highest gauge pressure of this zone today, psi; null when it is not known, which holds the air back. */
  ceilingPsi: number | null;
  /** The zone that is about to get air; the screen's zone counts as open. Null when no zone is chosen. */
  zoneId: string | null;
}

/**
 * What must hold before air goes on, each with whether it does. Air is not offered until `mayStartAir` of the answer is true.
 */
export function airInterlocks(state: VisitState, system: System, conditions: AirConditions): Interlock[] {
  const met: Record<InterlockId, boolean> = {
    'water-off': state.waterOff !== null,
    'pressure-relieved': state.pressureRelieved !== null,
    'sensitive-parts': sensitivePartsAreSafe(state, system),
    'backflow-closed': backflowIsClosed(state, system),
    'connection-downstream': state.connection?.downstreamOfBackflow === true,
    'couplings-pinned': state.connection?.couplingsPinned === true,
    'regulator-under-ceiling':
      state.regulator !== null &&
      conditions.ceilingPsi !== null &&
      state.regulator.pressurePsi <= conditions.ceilingPsi,
    'zone-open': conditions.zoneId !== null || Object.values(state.zones).some((zone) => zone.open),
    'cautions-read': state.cautionsRead.length > 0,
    'people-clear': peopleAreClear(state),
  };
  return interlockIds.map((id) => {
    const protectsPeople = protecting.has(id);
    const passed = protectsPeople ? undefined : state.interlocksPassed.find((one) => one.interlock === id);
    return { id, satisfied: met[id], protectsPeople, passedBy: passed?.reason ?? null };
  });
}

/** True when every interlock holds, or was passed with a reason where no person is at risk. */
export function mayStartAir(interlocks: readonly Interlock[]): boolean {
  return interlocks.every((lock) => lock.satisfied || (!lock.protectsPeople && lock.passedBy !== null));
}

/** The area is clear and eyes and ears are protected, as said last. */
export function peopleAreClear(state: VisitState): boolean {
  return state.peopleClear?.areaClear === true && state.peopleClear.eyesAndEars;
}

/** Every part is removed, bypassed or declared absent. `not-found` and `left` leave it at risk. */
function sensitivePartsAreSafe(state: VisitState, system: System): boolean {
  const expected = new Set([...system.sensitiveParts.map((part) => part.id), ...Object.keys(state.parts)]);
  return [...expected].every((id) => {
    const part = state.parts[id];
    if (!part) return false;
    if (part.protection) return part.protection.how !== 'left';
    return part.outcome === 'none';
  });
}

/** Every shutoff of the assembly is closed while air is on; an assembly without shutoffs has nothing to close. */
function backflowIsClosed(state: VisitState, system: System): boolean {
  return system.backflow.valves
    .filter((valve) => valve.role === 'shutoff')
    .every((valve) => state.valves[valve.id]?.beforeAir?.position === 'closed');
}
