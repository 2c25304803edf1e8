import type { EntryBody, EntryType, Envelope, PhotoReference } from '@rimeward/field-log';
import { v7 as uuidv7 } from 'uuid';
import { appVersion } from '../app-version';
import type { ClockKnowledge } from '../clock/known-time';
import { typeVersions } from './type-versions';
import { wellFormed } from './well-formed';

/** One fact to be written down now. */
export type NewEntry = {
  [T in EntryType]: {
    visit: string;
    type: T;
    body: EntryBody<T>;
    photos?: PhotoReference[];
    actor: string;
    company: string;
  };
}[EntryType];

let zone = { name: '', hour: -1 };

/** The phone's time zone, asked anew once an hour: the browser takes its time to tell, and a journey takes longer. */
function timeZoneAt(wallMs: number): string {
  const hour = Math.floor(wallMs / 3_600_000);
  if (zone.hour !== hour) zone = { name: Intl.DateTimeFormat().resolvedOptions().timeZone ?? 'UTC', hour };
  return zone.name;
}

export type UnsealedEntry = Omit<Envelope, 'seq' | 'prev'>;

/** Everything of the envelope but the place in the chain. The clock is written down as told, with its known offset. */
export function entryDraft(
  entry: NewEntry,
  device: string,
  clock: ClockKnowledge,
  wallMs: number,
): UnsealedEntry {
  const age = clock.estimatedAtMs === null ? null : wallMs - clock.estimatedAtMs;
  return wellFormed({
    v: 1,
    id: uuidv7(),
    device,
    company: entry.company,
    actor: entry.actor,
    visit: entry.visit,
    type: entry.type,
    typeVersion: typeVersions[entry.type],
    body: entry.body,
    photos: entry.photos ?? [],
    time: {
      wall: new Date(wallMs).toISOString(),
      zone: timeZoneAt(wallMs),
      offsetMs: clock.offsetMs,
      // A clock set back since the estimate makes its age unknown.
      offsetAgeMs: age !== null && age >= 0 ? age : null,
    },
    app: appVersion,
  });
}
