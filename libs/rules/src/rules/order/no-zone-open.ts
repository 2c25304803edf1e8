import type { AirCycle, FoldedEntry } from '@rimeward/field-log';
import { named, type VisitFacts } from '../../facts/facts';
import type { Rule } from '../../finding/rule';
import { deadEnds } from '../sources';

/** Air was on beyond the doubt of the clocks when the zone was closed. */
function airWasOn(
  { standing, placeOf, surelyBefore }: VisitFacts,
  cycle: AirCycle,
  closing: FoldedEntry,
): boolean {
  const start = standing[placeOf(cycle.started.entryId)];
  const stop = cycle.stopped ? standing[placeOf(cycle.stopped.entryId)] : null;
  return (!start || surelyBefore(start, closing)) && (!stop || surelyBefore(closing, stop));
}

/** The last open zone was closed while air was on: the whole system became a closed vessel. */
export const noZoneOpen: Rule<'no-zone-open'> = {
  id: 'no-zone-open',
  severity: 'danger',
  basis: deadEnds,
  find(facts, report) {
    const { standing, cycles, placeOf, zoneOf } = facts;
    if (cycles.length === 0 || !facts.first('zone-closed')) return;
    const open = new Set<string>();
    const running = new Map<string, AirCycle>();
    const byStart = new Map(cycles.map((cycle) => [cycle.started.entryId, cycle]));
    const lastIn = new Map<string, string>();
    for (const [place, folded] of standing.entries()) {
      const { entry } = folded;
      if (entry.type === 'zone-opened') {
        open.add(entry.body.zoneId);
      } else if (entry.type === 'air-started') {
        const cycle = byStart.get(entry.id);
        if (!cycle || (cycle.stopped && placeOf(cycle.stopped.entryId) < place)) continue;
        open.add(cycle.zoneId);
        running.set(cycle.cycleId, cycle);
        lastIn.set(cycle.zoneId, cycle.cycleId);
      } else if (entry.type === 'air-stopped') {
        const zoneId = running.get(entry.body.cycleId)?.zoneId;
        running.delete(entry.body.cycleId);
        if (zoneId !== undefined && lastIn.get(zoneId) === entry.body.cycleId) open.delete(zoneId);
      } else if (entry.type === 'zone-closed') {
        open.delete(entry.body.zoneId);
        if (open.size > 0) continue;
        const under = [...running.values()].find((cycle) => airWasOn(facts, cycle, folded));
        if (under) report([under.started.entryId, entry.id], named(zoneOf(entry.body.zoneId)));
      }
    }
  },
};
