import type { VisitState } from '../visit/visit-state';

/** `no-open-zone`: pressure builds against closed valves. `past-cap`: heads run hot. `after-dry`: no water left to cool them. */
export interface AirAlarm {
  kind: 'no-open-zone' | 'past-cap' | 'after-dry';
  zoneId: string | null;
}

/**
 * What is wrong with the air right now, worst first; empty while air is off.
 * `capsMs` holds the longest cycle of each zone in ms; a zone without one has no cap.
 */
export function airAlarms(
  state: VisitState,
  nowMs: number,
  capsMs: Readonly<Record<string, number>>,
): AirAlarm[] {
  if (!state.airOn) return [];
  const alarms: AirAlarm[] = [];
  if (!Object.values(state.zones).some((zone) => zone.open))
    alarms.push({ kind: 'no-open-zone', zoneId: null });
  for (const cycle of state.runningCycles) {
    const cap = capsMs[cycle.zoneId];
    if (cap !== undefined && nowMs - cycle.started.atMs > cap) {
      alarms.push({ kind: 'past-cap', zoneId: cycle.zoneId });
    }
  }
  for (const cycle of state.runningCycles) {
    const earlier = state.zones[cycle.zoneId]?.cycles ?? [];
    if (earlier.some((one) => one.cycleId !== cycle.cycleId && one.endSign === 'dry')) {
      alarms.push({ kind: 'after-dry', zoneId: cycle.zoneId });
    }
  }
  return alarms;
}
