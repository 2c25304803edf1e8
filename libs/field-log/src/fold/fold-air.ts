import type { AirCycle, FoldedEntry, Said, VisitState, ZoneState } from '../visit/visit-state';
import { said } from './said';

interface Stop {
  said: Said;
  elapsedMs: number | null;
}

/** Facts about cycles that may stand in the log before the cycle's own start (another phone wrote them). */
export interface CycleFacts {
  stops: Map<string, Stop>;
  /** Stops that the pass through the log has met so far. */
  stopsPassed: Set<string>;
  cycles: Map<string, AirCycle>;
  signs: Map<string, AirCycle['endSign']>;
  gauges: Map<string, AirCycle['gaugeReadings']>;
}

export function zoneState(state: VisitState, zoneId: string): ZoneState {
  const known = state.zones[zoneId];
  if (known) return known;
  const zone: ZoneState = { zoneId, open: false, cycles: [], skipped: null, headsSeen: [] };
  state.zones[zoneId] = zone;
  return zone;
}

/** Collects what belongs to a cycle by its id, whatever order it was said in. */
export function collectCycleFacts(entries: readonly FoldedEntry[]): CycleFacts {
  const facts: CycleFacts = {
    stops: new Map(),
    stopsPassed: new Set(),
    cycles: new Map(),
    signs: new Map(),
    gauges: new Map(),
  };
  for (const folded of entries) {
    if (folded.standing === 'withdrawn') continue;
    const { entry } = folded;
    if (entry.type === 'air-stopped' && !facts.stops.has(entry.body.cycleId)) {
      facts.stops.set(entry.body.cycleId, { said: said(folded), elapsedMs: entry.body.elapsedMs });
    } else if (entry.type === 'end-sign-seen') {
      facts.signs.set(entry.body.cycleId, entry.body.sign);
    } else if (entry.type === 'gauge-read' && entry.body.cycleId !== null) {
      const readings = facts.gauges.get(entry.body.cycleId) ?? [];
      readings.push({ pressurePsi: entry.body.pressurePsi, said: said(folded) });
      facts.gauges.set(entry.body.cycleId, readings);
    }
  }
  return facts;
}

/** A cycle begins: air goes on and the zone counts as open. A cycle id is used once; a second start of it changes nothing. */
export function startCycle(
  state: VisitState,
  folded: FoldedEntry,
  body: { cycleId: string; zoneId: string; gaugePsi: number | null },
  facts: CycleFacts,
): void {
  if (facts.cycles.has(body.cycleId)) return;
  const zone = zoneState(state, body.zoneId);
  const started = said(folded);
  const stop = facts.stops.get(body.cycleId);
  const wallMs = stop ? Math.max(0, stop.said.atMs - started.atMs) : null;
  const steadyMs = stop?.elapsedMs ?? null;
  const first = body.gaugePsi === null ? [] : [{ pressurePsi: body.gaugePsi, said: started }];
  // A helper whose clock is behind may have said "stopped" before the lead's "started": the zone is then shut already.
  if (!facts.stopsPassed.has(body.cycleId)) zone.open = true;
  const cycle: AirCycle = {
    cycleId: body.cycleId,
    zoneId: body.zoneId,
    started,
    stopped: stop?.said ?? null,
    durationMs: steadyMs ?? wallMs,
    durationFrom: !stop ? null : steadyMs !== null ? 'steady-clock' : 'wall-clock',
    gaugeReadings: [...first, ...(facts.gauges.get(body.cycleId) ?? [])],
    endSign: facts.signs.get(body.cycleId) ?? null,
  };
  zone.cycles.push(cycle);
  facts.cycles.set(body.cycleId, cycle);
}

/** The end of a cycle closes its zone, unless another cycle has been started in it meanwhile. */
export function stopCycle(state: VisitState, cycleId: string, facts: CycleFacts): void {
  facts.stopsPassed.add(cycleId);
  const cycle = facts.cycles.get(cycleId);
  const zone = cycle && state.zones[cycle.zoneId];
  if (zone?.cycles.at(-1) === cycle && zone) zone.open = false;
}

/** Which cycles still run, oldest first; air is on while one does. */
export function settleAir(state: VisitState): void {
  const cycles = Object.values(state.zones).flatMap((zone) => zone.cycles);
  state.runningCycles = cycles
    .filter((cycle) => cycle.stopped === null)
    .sort((one, other) => one.started.atMs - other.started.atMs);
  state.airOn = state.runningCycles.length > 0;
}
