import type { System } from '../system/system';
import { peopleAreClear } from '../interlocks/interlocks';
import type { VisitState, ZoneState } from '../visit/visit-state';

/** The work of a visit in its safe order. */
export const visitStepIds = [
  'arrive',
  'walk-through',
  'water-off',
  'relief',
  'backflow-before-air',
  'connect',
  'regulator',
  'people-clear',
  'air',
  'close-down',
  'backflow-winter',
  'drains',
  'pump',
  'plug',
  'controller',
  'leave',
] as const;
export type VisitStepId = (typeof visitStepIds)[number];

export interface VisitStep {
  id: VisitStepId;
  status: 'todo' | 'partly' | 'done' | 'not-needed';
  /** How many of its parts are recorded, of how many. */
  done: number;
  total: number;
  /** True for the one step that is proposed next. */
  proposed: boolean;
}

/** Steps that exist only where air is used. */
const airSteps: ReadonlySet<VisitStepId> = new Set([
  'backflow-before-air',
  'connect',
  'regulator',
  'people-clear',
  'air',
  'close-down',
  'plug',
]);

/** A zone is done after two cycles or more that ended in mist or dry, or when it was skipped with a reason. */
export function zoneIsDone(zone: ZoneState | undefined): boolean {
  if (!zone) return false;
  if (zone.skipped) return true;
  const stopped = zone.cycles.filter((cycle) => cycle.stopped);
  const last = stopped.at(-1)?.endSign;
  return stopped.length >= 2 && (last === 'mist' || last === 'dry');
}

/**
 * The list of work with what is recorded of each step. A system that nobody knows is treated as blow-out; the method said on
 * arrival rules over the one on record.
 */
export function visitSteps(state: VisitState, system: System): VisitStep[] {
  const method = state.arrived?.removalMethod ?? system.removalMethod;
  const withAir = method === 'blow-out' || method === 'unknown';
  const counted = visitStepIds.map((id): VisitStep => {
    const [done, total] = !withAir && airSteps.has(id) ? [0, 0] : counts(id, state, system);
    const status = total === 0 ? 'not-needed' : done >= total ? 'done' : done > 0 ? 'partly' : 'todo';
    return { id, status, done: Math.min(done, total), total, proposed: false };
  });
  const next = state.left
    ? undefined
    : counted.find((step) => step.status === 'todo' || step.status === 'partly');
  return counted.map((step) => ({ ...step, proposed: step === next }));
}

function counts(id: VisitStepId, state: VisitState, system: System): [done: number, total: number] {
  const one = (said: unknown): [number, number] => [said ? 1 : 0, 1];
  switch (id) {
    case 'arrive':
      return one(state.arrived);
    case 'walk-through':
      return walkThrough(state, system);
    case 'water-off':
      return one(state.waterOff);
    case 'relief':
      return one(state.pressureRelieved);
    case 'backflow-before-air': {
      const shutoffs = system.backflow.valves.filter((valve) => valve.role === 'shutoff');
      return [shutoffs.filter((valve) => state.valves[valve.id]?.beforeAir).length, shutoffs.length];
    }
    case 'connect':
      return one(state.connection);
    case 'regulator':
      return one(state.regulator);
    case 'people-clear':
      return one(peopleAreClear(state) && state.cautionsRead.length > 0);
    case 'air':
      return [system.zones.filter((zone) => zoneIsDone(state.zones[zone.id])).length, system.zones.length];
    case 'close-down':
      return [Object.keys(state.closeDown).length, 3];
    case 'backflow-winter': {
      const valves = system.backflow.valves;
      return [valves.filter((valve) => state.valves[valve.id]?.winter).length, valves.length];
    }
    case 'drains':
      return [system.drains.filter((drain) => state.drains[drain.id]).length, system.drains.length];
    case 'pump':
      return system.pump ? one(state.pump) : [0, 0];
    case 'plug':
      return one(state.plug);
    case 'controller':
      return one(state.controller);
    case 'leave':
      return one(state.left);
  }
}

/** Nothing known and nothing found: the walk-through is done once somebody has arrived and gone on to the water. */
function walkThrough(state: VisitState, system: System): [number, number] {
  const ids = new Set([...system.sensitiveParts.map((part) => part.id), ...Object.keys(state.parts)]);
  if (ids.size === 0) return [state.waterOff ? 1 : 0, 1];
  const settled = [...ids].filter((id) => {
    const part = state.parts[id];
    return part && (part.outcome !== 'found' || part.protection !== null);
  });
  return [settled.length, ids.size];
}
