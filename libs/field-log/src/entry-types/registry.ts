import type { z } from 'zod';
import * as air from './air';
import * as arrival from './arrival';
import * as leaving from './leaving';
import * as walkThrough from './walk-through';
import * as water from './water';
import * as winter from './winter';

/**
 * Every entry type at its newest version. A released version is never edited: a change is a new version here and
 * an upcast from the old one in `upcast.ts`.
 */
export const entryTypes = {
  arrived: { version: 1, body: arrival.arrivedBody },
  'cautions-read': { version: 1, body: arrival.cautionsReadBody },
  'damage-seen': { version: 1, body: arrival.damageSeenBody },
  'part-looked-for': { version: 1, body: walkThrough.partLookedForBody },
  'part-protected': { version: 1, body: walkThrough.partProtectedBody },
  'photographs-added': { version: 1, body: walkThrough.photographsAddedBody },
  'water-off': { version: 1, body: water.waterOffBody },
  'pressure-relieved': { version: 1, body: water.pressureRelievedBody },
  'valve-set': { version: 1, body: water.valveSetBody },
  'air-connected': { version: 1, body: air.airConnectedBody },
  'regulator-set': { version: 1, body: air.regulatorSetBody },
  'people-clear': { version: 1, body: air.peopleClearBody },
  'interlock-passed': { version: 1, body: air.interlockPassedBody },
  'zone-opened': { version: 1, body: air.zoneOpenedBody },
  'zone-closed': { version: 1, body: air.zoneClosedBody },
  'air-started': { version: 1, body: air.airStartedBody },
  'air-stopped': { version: 1, body: air.airStoppedBody },
  'end-sign-seen': { version: 1, body: air.endSignSeenBody },
  'gauge-read': { version: 1, body: air.gaugeReadBody },
  'heads-seen': { version: 1, body: air.headsSeenBody },
  'zone-skipped': { version: 1, body: air.zoneSkippedBody },
  'air-closed-down': { version: 1, body: air.airClosedDownBody },
  'drain-set': { version: 1, body: winter.drainSetBody },
  'pump-drained': { version: 1, body: winter.pumpDrainedBody },
  'connection-plugged': { version: 1, body: winter.connectionPluggedBody },
  'controller-set': { version: 1, body: winter.controllerSetBody },
  insulated: { version: 1, body: winter.insulatedBody },
  'defect-found': { version: 1, body: leaving.defectFoundBody },
  'note-written': { version: 1, body: leaving.noteWrittenBody },
  left: { version: 1, body: leaving.leftBody },
  'question-answered': { version: 1, body: leaving.questionAnsweredBody },
  corrected: { version: 1, body: leaving.correctedBody },
} as const;

export type EntryType = keyof typeof entryTypes;

export type EntryBody<T extends EntryType> = z.infer<(typeof entryTypes)[T]['body']>;
