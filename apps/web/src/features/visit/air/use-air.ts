import {
  airAlarms,
  airInterlocks,
  type AirCycle,
  type EntryBody,
  type Interlock,
  type Zone,
} from '@rimeward/field-log';
import { useRef } from 'react';
import { v7 as uuidv7 } from 'uuid';
import { useVisitLog } from '../log/visit-log';
import { elapsedBySteadyClock, type CycleMark } from './cycle-clock';
import { capMs } from './cycle-plan';

export interface Air {
  cycles: AirCycle[];
  /** The cycle that runs in this zone now; survives reload, since it is read from the entries. */
  running: AirCycle | null;
  /** The newest stopped cycle that nobody has given an end sign yet. */
  unsigned: AirCycle | null;
  interlocks: Interlock[];
  alarms: ReturnType<typeof airAlarms>;
  start: () => Promise<void>;
  stop: () => Promise<void>;
  sign: (sign: EntryBody<'end-sign-seen'>['sign']) => Promise<void>;
  readGauge: (pressurePsi: number) => Promise<void>;
  skip: (reason: string) => Promise<boolean>;
  pass: (interlock: string, reason: string) => Promise<boolean>;
}

/** What can be done in one zone right now, and what holds it back. */
export function useAir(zone: Zone, nowMs: number): Air {
  const { state, system, ceilings, save } = useVisitLog();
  const mark = useRef<CycleMark | null>(null);
  const busy = useRef(new Set<string>());
  const cycles = state.zones[zone.id]?.cycles ?? [];
  const running = cycles.find((cycle) => !cycle.stopped) ?? null;
  const last = cycles.at(-1) ?? null;
  const unsigned = last && last.stopped && !last.endSign ? last : null;

  /** Ten taps on one control are one; another control does not wait for it. */
  async function once(action: string, work: () => Promise<unknown>): Promise<void> {
    if (busy.current.has(action)) return;
    busy.current.add(action);
    try {
      await work();
    } finally {
      busy.current.delete(action);
    }
  }

  return {
    cycles,
    running,
    unsigned,
    interlocks: airInterlocks(state, system, {
      ceilingPsi: ceilings[zone.id]?.pressurePsi ?? null,
      zoneId: zone.id,
    }),
    alarms: airAlarms(state, nowMs, { [zone.id]: capMs(zone.headKind) }),
    start: () =>
      once('start', async () => {
        // The entry of a start just tapped may be saved and not yet on the screen.
        const unseen = mark.current && !cycles.some((cycle) => cycle.cycleId === mark.current?.cycleId);
        if (running || unseen) return;
        const cycleId = uuidv7();
        const started = { cycleId, steadyMs: performance.now(), wallMs: Date.now() };
        const gaugePsi = state.regulator?.pressurePsi ?? null;
        if (await save('air-started', { cycleId, zoneId: zone.id, gaugePsi })) mark.current = started;
      }),
    stop: () =>
      once('stop', async () => {
        if (!running) return;
        const now = { steadyMs: performance.now(), wallMs: Date.now() };
        const elapsedMs = elapsedBySteadyClock(mark.current, running.cycleId, now);
        await save('air-stopped', { cycleId: running.cycleId, elapsedMs });
      }),
    sign: (sign) =>
      once('sign', async () => unsigned && save('end-sign-seen', { cycleId: unsigned.cycleId, sign })),
    readGauge: (pressurePsi) =>
      once('gauge', () => save('gauge-read', { cycleId: (running ?? last)?.cycleId ?? null, pressurePsi })),
    skip: (reason) => save('zone-skipped', { zoneId: zone.id, reason }),
    pass: (interlock, reason) => save('interlock-passed', { interlock, reason }),
  };
}
