import type { VisitState } from '../visit/visit-state';

export function emptyState(): VisitState {
  return {
    entries: [],
    actors: [],
    devices: [],
    arrived: null,
    cautionsRead: [],
    parts: {},
    waterOff: null,
    pressureRelieved: null,
    valves: {},
    connection: null,
    regulator: null,
    peopleClear: null,
    interlocksPassed: [],
    zones: {},
    runningCycles: [],
    airOn: false,
    closeDown: {},
    drains: {},
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
