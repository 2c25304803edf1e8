import { named } from '../../facts/facts';
import type { Rule } from '../../finding/rule';
import { deadEnds } from '../sources';

/** The last open zone was closed while air was on: the whole system became a closed vessel. */
export const noZoneOpen: Rule<'no-zone-open'> = {
  id: 'no-zone-open',
  severity: 'danger',
  basis: deadEnds,
  find({ standing, cycles, placeOf, zoneOf }, report) {
    if (cycles.length === 0) return;
    const open = new Set<string>();
    const running = new Map<string, string>();
    const stopOf = new Map(cycles.map((cycle) => [cycle.started.entryId, cycle.stopped?.entryId]));
    const lastIn = new Map<string, string>();
    for (const [place, { entry }] of standing.entries()) {
      if (entry.type === 'zone-opened') {
        open.add(entry.body.zoneId);
      } else if (entry.type === 'air-started' && stopOf.has(entry.id)) {
        const stop = stopOf.get(entry.id);
        if (stop !== undefined && placeOf(stop) < place) continue;
        open.add(entry.body.zoneId);
        running.set(entry.body.cycleId, entry.body.zoneId);
        lastIn.set(entry.body.zoneId, entry.body.cycleId);
      } else if (entry.type === 'air-stopped') {
        const zoneId = running.get(entry.body.cycleId);
        running.delete(entry.body.cycleId);
        if (zoneId !== undefined && lastIn.get(zoneId) === entry.body.cycleId) open.delete(zoneId);
      } else if (entry.type === 'zone-closed') {
        open.delete(entry.body.zoneId);
        if (running.size > 0 && open.size === 0) report([entry.id], named(zoneOf(entry.body.zoneId)));
      }
    }
  },
};
