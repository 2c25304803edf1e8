import type { EntryType } from '@rimeward/field-log';

/**
 * Newest version of each entry type. Kept here beside the schemas' own registry, which a test compares it with, so that
 * the phone's first route does not carry the schemas.
 */
export const typeVersions: Record<EntryType, number> = {
  arrived: 1,
  'cautions-read': 1,
  'damage-seen': 1,
  'part-looked-for': 1,
  'part-protected': 1,
  'photographs-added': 1,
  'water-off': 1,
  'pressure-relieved': 1,
  'valve-set': 1,
  'air-connected': 1,
  'regulator-set': 1,
  'people-clear': 1,
  'interlock-passed': 1,
  'zone-opened': 1,
  'zone-closed': 1,
  'air-started': 1,
  'air-stopped': 1,
  'end-sign-seen': 1,
  'gauge-read': 1,
  'heads-seen': 1,
  'zone-skipped': 1,
  'air-closed-down': 1,
  'drain-set': 1,
  'pump-drained': 1,
  'connection-plugged': 1,
  'controller-set': 1,
  insulated: 1,
  'defect-found': 1,
  'note-written': 1,
  left: 1,
  'question-answered': 1,
  corrected: 1,
};
