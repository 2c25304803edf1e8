import type { EntryBody } from '../entry-types/registry';
import type { LogEntry, LogEntryOf } from '../entry/log-entry';
import type { PhotoReference } from '../entry/envelope';
import type { SensitivePartKind } from '../words/words';

/** Where a fact comes from: the entry that said it last, who said it and when by the doubtful clock of the phone. */
export interface Said {
  entryId: string;
  device: string;
  seq: number;
  actor: string;
  /** Estimated true time, ms since the epoch: wall clock plus the known offset. A claim, not a proof. */
  atMs: number;
}

export interface PartState extends Said {
  partId: string;
  kind: SensitivePartKind;
  outcome: EntryBody<'part-looked-for'>['outcome'];
  protection: (EntryBody<'part-protected'> & Said) | null;
  photos: PhotoReference[];
}

export interface ValveState {
  valveId: string;
  beforeAir: (EntryBody<'valve-set'> & Said) | null;
  winter: (EntryBody<'valve-set'> & Said) | null;
  photos: PhotoReference[];
}

export interface AirCycle {
  cycleId: string;
  zoneId: string;
  started: Said;
  stopped: Said | null;
  /** Steady-clock length when known, else the difference of the two times; null while air is on. */
  durationMs: number | null;
  durationFrom: 'steady-clock' | 'wall-clock' | null;
  gaugeReadings: { pressurePsi: number; said: Said }[];
  endSign: EntryBody<'end-sign-seen'>['sign'] | null;
}

export interface ZoneState {
  zoneId: string;
  open: boolean;
  cycles: AirCycle[];
  skipped: (EntryBody<'zone-skipped'> & Said) | null;
  headsSeen: (EntryBody<'heads-seen'> & Said)[];
}

/** An entry as it stands in the visit, with its corrections beside it. */
export interface FoldedEntry {
  entry: LogEntry;
  /** Estimated true time, never decreasing along one device's sequence. */
  atMs: number;
  /** The time as this entry alone claims it; earlier than `atMs` where the clock was set back. */
  claimedMs: number;
  corrections: LogEntryOf<'corrected'>[];
  /** Ids of corrections whose new body is not one of this entry's type; they change nothing and a person looks at them. */
  ignoredCorrections: string[];
  /** `standing` as written, `corrected` with another body, `withdrawn` altogether. */
  standing: 'standing' | 'corrected' | 'withdrawn';
}

/**
 * The state of one visit: a pure function of its set of entries, the same on phone and server, whatever order
 * they arrived in.
 */
export interface VisitState {
  entries: FoldedEntry[];
  actors: string[];
  devices: string[];
  arrived: (EntryBody<'arrived'> & Said) | null;
  cautionsRead: (EntryBody<'cautions-read'> & Said)[];
  parts: Record<string, PartState>;
  waterOff: (EntryBody<'water-off'> & Said) | null;
  pressureRelieved: (EntryBody<'pressure-relieved'> & Said) | null;
  valves: Record<string, ValveState>;
  connection: (EntryBody<'air-connected'> & Said) | null;
  regulator: (EntryBody<'regulator-set'> & Said) | null;
  peopleClear: (EntryBody<'people-clear'> & Said) | null;
  interlocksPassed: (EntryBody<'interlock-passed'> & Said)[];
  zones: Record<string, ZoneState>;
  /** Cycles that have started and not stopped, oldest first. */
  runningCycles: AirCycle[];
  airOn: boolean;
  closeDown: Partial<Record<EntryBody<'air-closed-down'>['step'], Said>>;
  drains: Record<string, EntryBody<'drain-set'> & Said>;
  pump: (EntryBody<'pump-drained'> & Said) | null;
  plug: (EntryBody<'connection-plugged'> & Said) | null;
  controller: (EntryBody<'controller-set'> & Said) | null;
  insulated: (EntryBody<'insulated'> & Said)[];
  damageSeen: (EntryBody<'damage-seen'> & Said & { photos: PhotoReference[] })[];
  defects: (EntryBody<'defect-found'> & Said & { photos: PhotoReference[] })[];
  notes: (EntryBody<'note-written'> & Said)[];
  answers: (EntryBody<'question-answered'> & Said)[];
  left: (EntryBody<'left'> & Said) | null;
  /** Every photograph of the visit with the entry that brought it, in log order. */
  photos: { photo: PhotoReference; entryId: string; subject: string | null }[];
}
