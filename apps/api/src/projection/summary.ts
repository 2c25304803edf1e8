import type { QueueItem, VisitDocument, VisitStanding } from '@rimeward/contracts';
import type { VisitState, ZoneState } from '@rimeward/field-log';

/** Figures of a visit at a glance, from its state. */
export interface VisitFigures {
  cycles: number;
  zonesDone: number;
  zonesTotal: number;
  arrivedAt: string | null;
  leftAt: string | null;
}

export function figuresOf(document: VisitDocument, state: VisitState): VisitFigures {
  const zones = Object.values(state.zones);
  return {
    cycles: zones.reduce((sum, zone) => sum + zone.cycles.length, 0),
    zonesDone: zones.filter(isDone).length,
    zonesTotal: document.system.zones.length,
    arrivedAt: state.arrived === null ? null : instant(state.arrived.atMs),
    leftAt: state.left === null ? null : instant(state.left.atMs),
  };
}

/** Blown until mist or dry, or skipped with a reason. */
function isDone(zone: ZoneState): boolean {
  const signs = zone.cycles.map((cycle) => cycle.endSign);
  return zone.skipped !== null || signs.includes('mist') || signs.includes('dry');
}

/** A doubtful clock can name a time that no calendar has; then there is none to show. */
function instant(ms: number): string | null {
  const at = new Date(ms);
  return Number.isNaN(at.getTime()) || at.getUTCFullYear() > 9999 || at.getUTCFullYear() < 1
    ? null
    : at.toISOString();
}

export type Finding = QueueItem['worst'][number];

export interface Projection extends VisitFigures {
  document: VisitDocument;
  standing: VisitStanding;
  findings: Finding[];
  rulesVersion: string;
  atTheEnd: boolean;
  actorIds: string[];
  heldEntries: number;
  position: number;
}
