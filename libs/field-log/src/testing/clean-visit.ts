import type { EntryBody, EntryType } from '../entry-types/registry';
import type { PhotoReference } from '../entry/envelope';
import type { LogEntry } from '../entry/log-entry';
import type { System } from '../system/system';
import { entry, photo, testId } from './builders';

/** One line of a visit before it has its number: what was written, how many minutes after the line before, with which photographs. */
export interface Line<T extends EntryType = EntryType> {
  type: T;
  body: EntryBody<T>;
  wait: number;
  photos: PhotoReference[];
}

/** Writes a line; a visit is a list of them, so that tests can take one out, put one in or change one. */
export function line<T extends EntryType>(
  type: T,
  body: EntryBody<T>,
  about: { wait?: number; photos?: PhotoReference[] } = {},
): Line<T> {
  return { type, body, wait: about.wait ?? 1, photos: about.photos ?? [] };
}

export const people = { lead: testId(900), helper: testId(901) } as const;

/** Everything done right, in order, with every photograph: two cycles a zone of a minute, two minutes of rest. */
export function cleanVisit(system: System): Line[] {
  let pictures = 0;
  const picture = () => ({ photos: [photo((pictures += 1))] });
  const shutoffs = system.backflow.valves.filter((valve) => valve.role === 'shutoff');
  const lines: Line[] = [
    line('arrived', {
      position: null,
      airTemperatureF: 45,
      sky: 'clear',
      crew: [people.lead, people.helper],
      compressorId: testId(71),
      hoseId: testId(72),
      removalMethod: system.removalMethod,
    }),
    line('cautions-read', { card: 'before-first-air', language: 'en' }),
  ];
  for (const { id: partId, kind } of system.sensitiveParts) {
    lines.push(line('part-looked-for', { partId, kind, outcome: 'found' }));
    lines.push(line('part-protected', { partId, kind, how: 'removed-blank', keptWhere: 'truck' }, picture()));
  }
  lines.push(line('water-off', { kind: 'shutoff-closed' }));
  lines.push(line('pressure-relieved', { zoneId: system.zones[0]?.id ?? null }));
  for (const { id: valveId } of shutoffs) {
    lines.push(line('valve-set', { valveId, stage: 'before-air', position: 'closed', workedThrough: false }));
  }
  lines.push(
    line('air-connected', { place: 'blow-out-fitting', downstreamOfBackflow: true, couplingsPinned: true }),
    line('regulator-set', { pressurePsi: 50 }),
    line('people-clear', { areaClear: true, eyesAndEars: true }),
  );
  for (const round of [1, 2]) {
    for (const { id: zoneId, number } of system.zones) {
      const cycleId = testId(2_000 + number * 10 + round);
      lines.push(
        line('air-started', { cycleId, zoneId, gaugePsi: 45 }, { wait: 2 }),
        line('air-stopped', { cycleId, elapsedMs: 60_000 }),
        line('end-sign-seen', { cycleId, sign: round === 1 ? 'spitting' : 'mist' }, { wait: 0 }),
      );
    }
  }
  for (const step of ['compressor-off', 'hose-bled', 'hose-off'] as const) {
    lines.push(line('air-closed-down', { step }));
  }
  for (const { id: valveId } of system.backflow.valves) {
    const position = 'half-open' as const;
    lines.push(line('valve-set', { valveId, stage: 'winter', position, workedThrough: true }, picture()));
  }
  for (const { id: drainId } of system.drains) {
    lines.push(line('drain-set', { drainId, ranDry: true, position: 'closed' }));
  }
  if (system.pump) lines.push(line('pump-drained', { pumpId: system.pump.id, drained: true }));
  lines.push(
    line('connection-plugged', { plugged: true }),
    line('controller-set', { mode: 'off' }),
    line('left', { outcome: 'done', why: null, present: 'nobody-present' }),
  );
  return lines;
}

/** Numbers the lines of one phone and gives them their times. */
export function written(
  lines: readonly Line[],
  about: { device?: string; actor?: string; visit?: string; firstMinute?: number } = {},
): LogEntry[] {
  let minute = about.firstMinute ?? 0;
  return lines.map(({ type, body, wait, photos }, index) => {
    minute += wait;
    return entry(type, body, { ...about, seq: index + 1, minute, photos });
  });
}
