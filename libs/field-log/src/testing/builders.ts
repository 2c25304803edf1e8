import type { EntryBody, EntryType } from '../entry-types/registry';
import type { LogEntry } from '../entry/log-entry';
import type { PhotoReference } from '../entry/envelope';

/** A uuid that tests can read: the number in its last group. */
export function testId(number: number): string {
  return `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`;
}

interface Circumstances {
  device?: string;
  seq?: number;
  actor?: string;
  visit?: string;
  /** Minutes after the visit's first moment. */
  minute?: number;
  photos?: PhotoReference[];
}

const firstMoment = Date.UTC(2026, 9, 20, 14, 0);

/** One entry with plausible surroundings; tests name what they are about. The id follows device and sequence. */
export function entry<T extends EntryType>(type: T, body: EntryBody<T>, about: Circumstances = {}): LogEntry {
  const {
    device = testId(1),
    seq = 1,
    actor = testId(900),
    visit = testId(500),
    minute = seq,
    photos = [],
  } = about;
  return {
    v: 1,
    id: testId(Number(device.slice(-6)) * 10_000 + seq),
    device,
    seq,
    prev: '0'.repeat(64),
    company: testId(800),
    actor,
    visit,
    type,
    typeVersion: 1,
    body,
    photos,
    time: {
      wall: new Date(firstMoment + minute * 60_000).toISOString(),
      zone: 'America/Denver',
      offsetMs: 0,
      offsetAgeMs: 0,
    },
    app: 'test',
  } as LogEntry;
}

/** Numbers a list of entries of one device in the order given, a minute apart. */
export function chain(entries: ((about: Circumstances) => LogEntry)[], device = testId(1)): LogEntry[] {
  return entries.map((make, index) => make({ device, seq: index + 1, minute: index + 1 }));
}

export function photo(number: number): PhotoReference {
  return {
    sha256: String(number).padStart(64, '0'),
    bytes: 2_000_000 + number,
    type: 'image/jpeg',
    role: 'sensitive-part',
    takenAt: null,
    source: 'camera',
  };
}
