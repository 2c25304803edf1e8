import type { VisitState } from '../visit/visit-state';

/** A table without inherited members: ids come from outside, and one of them may be called `constructor`. */
function byId<T>(): Record<string, T> {
  return Object.create(null) as Record<string, T>;
}

/** The state of a visit of which nothing has been written down. */
export function emptyState(): VisitState {
  return {
    entries: [],
    actors: [],
    devices: [],
    arrived: null,
    cautionsRead: [],
    parts: byId(),
    waterOff: null,
    pressureRelieved: null,
    valves: byId(),
    connection: null,
    regulator: null,
    peopleClear: null,
    interlocksPassed: [],
    zones: byId(),
    runningCycles: [],
    airOn: false,
    closeDown: {},
    drains: byId(),
    pump: null,
    plug: null,
    controller: null,
    insulated: [],
    damageSeen: [],
    defects: [],
    notes: [],
    answers: [],
    left: null,
    photos: [],
  };
}
