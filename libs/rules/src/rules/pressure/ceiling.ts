import { airSeconds, named, type VisitFacts } from '../../facts/facts';
import type { Rule } from '../../finding/rule';
import { extensionCeilings } from '../sources';

interface Reading {
  pressurePsi: number;
  entryId: string;
}

/** Readings over the ceiling with a cycle of the zone, and those that name no cycle but were taken while it ran. */
function* readingsOf(facts: VisitFacts, zoneId: string): Generator<Reading> {
  const { cycles } = facts.zoneOf(zoneId);
  for (const cycle of cycles) {
    for (const { pressurePsi, said } of cycle.gaugeReadings) yield { pressurePsi, entryId: said.entryId };
  }
  for (const { entry, atMs } of facts.standing) {
    if (entry.type !== 'gauge-read' || entry.body.cycleId !== null) continue;
    const during = cycles.some(
      ({ started, stopped }) => started.atMs <= atMs && atMs <= (stopped?.atMs ?? Number.POSITIVE_INFINITY),
    );
    if (during) yield { pressurePsi: entry.body.pressurePsi, entryId: entry.id };
  }
}

/** The gauge stood over what the weakest part of the way may carry. One finding a zone, with the highest reading. */
export const overCeiling: Rule<'over-ceiling'> = {
  id: 'over-ceiling',
  severity: 'danger',
  basis: extensionCeilings,
  find(facts, report) {
    for (const zone of facts.zones) {
      if (zone.cycles.length === 0) continue;
      const limit = zone.ceiling.pressurePsi + facts.thresholds.gaugeTolerancePsi;
      let worst = 0;
      const entryIds: string[] = [];
      for (const { pressurePsi, entryId } of readingsOf(facts, zone.id)) {
        if (pressurePsi <= limit) continue;
        worst = Math.max(worst, pressurePsi);
        entryIds.push(entryId);
      }
      if (entryIds.length === 0) continue;
      const over = zone.cycles.filter((one) =>
        one.gaugeReadings.some((reading) => reading.pressurePsi > limit),
      );
      report(entryIds, {
        ...named(zone),
        pressurePsi: worst,
        ceilingPsi: zone.ceiling.pressurePsi,
        overPsi: worst - zone.ceiling.pressurePsi,
        airSeconds: airSeconds(over),
        setBy: zone.ceiling.setBy,
      });
    }
  },
};

/** Air was given with the regulator set over the zone's ceiling. One finding a setting, for the zone with the lowest ceiling. */
export const regulatorOverCeiling: Rule<'regulator-over-ceiling'> = {
  id: 'regulator-over-ceiling',
  severity: 'fault',
  basis: extensionCeilings,
  find({ standing, zoneOf, cycles, thresholds }, report) {
    const starts = new Set(cycles.map((cycle) => cycle.started.entryId));
    let setting: { entryId: string; pressurePsi: number } | null = null;
    const lowest = new Map<string, { zoneId: string; startId: string; pressurePsi: number }>();
    for (const { entry } of standing) {
      if (entry.type === 'regulator-set')
        setting = { entryId: entry.id, pressurePsi: entry.body.pressurePsi };
      if (entry.type !== 'air-started' || !setting || !starts.has(entry.id)) continue;
      const { pressurePsi: ceilingPsi } = zoneOf(entry.body.zoneId).ceiling;
      if (setting.pressurePsi <= ceilingPsi + thresholds.gaugeTolerancePsi) continue;
      const before = lowest.get(setting.entryId);
      if (before && zoneOf(before.zoneId).ceiling.pressurePsi <= ceilingPsi) continue;
      const { zoneId } = entry.body;
      lowest.set(setting.entryId, { zoneId, startId: entry.id, pressurePsi: setting.pressurePsi });
    }
    for (const [entryId, { zoneId, startId, pressurePsi }] of lowest) {
      const zone = zoneOf(zoneId);
      const { pressurePsi: ceilingPsi, setBy } = zone.ceiling;
      report([entryId, startId], { ...named(zone), pressurePsi, ceilingPsi, setBy });
    }
  },
};
