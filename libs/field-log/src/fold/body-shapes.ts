import type { GeoPoint } from '../entry/envelope';
import type { EntryBody, EntryType } from '../entry-types/registry';
import * as words from '../words/words';
import {
  flag,
  listOf,
  number,
  oneOf,
  orAbsent,
  orNull,
  record,
  shaped,
  text,
  uuid,
  wholeNumber,
} from './shape';
import type { Check, Shape } from './shape';

const gaugePsi = number(0, 500);
const point: Shape<GeoPoint> = {
  latitude: number(-90, 90),
  longitude: number(-180, 180),
  accuracyM: number(0),
};

/**
 * What the body of each entry type looks like, said a second time without the schema library, so that a phone can fold a
 * visit without loading it. A test holds the two against each other over random bodies.
 */
const shapes: { readonly [T in EntryType]: Shape<EntryBody<T>> } = {
  arrived: {
    position: orNull(shaped(point)),
    airTemperatureF: orNull(number(-60, 130)),
    sky: orNull(oneOf(words.skies)),
    crew: listOf(uuid, 12),
    compressorId: orNull(uuid),
    hoseId: orNull(uuid),
    removalMethod: oneOf(words.removalMethods),
  },
  'cautions-read': { card: text(40), language: oneOf(words.cardLanguages) },
  'damage-seen': { where: text(200), what: text(1_000) },
  'part-looked-for': {
    partId: uuid,
    kind: oneOf(words.sensitivePartKinds),
    outcome: oneOf(words.partOutcomes),
    note: orAbsent(text(1_000)),
  },
  'part-protected': {
    partId: uuid,
    kind: oneOf(words.sensitivePartKinds),
    how: oneOf(words.partProtections),
    keptWhere: orNull(oneOf(words.keepingPlaces)),
    keptNote: orAbsent(text(200)),
    reason: orAbsent(text(1_000)),
  },
  'photographs-added': { subject: orNull(text(80)), caption: orAbsent(text(300)) },
  'water-off': { kind: oneOf(words.waterOffKinds), note: orAbsent(text(1_000)) },
  'pressure-relieved': { zoneId: orNull(uuid) },
  'valve-set': {
    valveId: text(40, 1),
    stage: oneOf(words.valveStages),
    position: oneOf(words.valvePositions),
    workedThrough: flag,
    note: orAbsent(text(500)),
  },
  'air-connected': {
    place: oneOf(words.connectionPlaces),
    downstreamOfBackflow: flag,
    couplingsPinned: flag,
  },
  'regulator-set': { pressurePsi: gaugePsi },
  'people-clear': { areaClear: flag, eyesAndEars: flag },
  'interlock-passed': { interlock: text(60), reason: text(1_000, 3) },
  'zone-opened': { zoneId: uuid },
  'zone-closed': { zoneId: uuid },
  'air-started': { cycleId: uuid, zoneId: uuid, gaugePsi: orNull(gaugePsi) },
  'air-stopped': { cycleId: uuid, elapsedMs: orNull(wholeNumber(0)) },
  'end-sign-seen': { cycleId: uuid, sign: oneOf(words.endSigns) },
  'gauge-read': { cycleId: orNull(uuid), pressurePsi: gaugePsi },
  'heads-seen': { zoneId: uuid, what: text(1_000, 1) },
  'zone-skipped': { zoneId: uuid, reason: text(1_000, 3) },
  'air-closed-down': { step: oneOf(words.closeDownSteps) },
  'drain-set': { drainId: uuid, ranDry: flag, position: oneOf(words.drainPositions) },
  'pump-drained': { pumpId: uuid, drained: flag },
  'connection-plugged': { plugged: flag },
  'controller-set': { mode: oneOf(words.controllerModes) },
  insulated: { what: oneOf(words.insulatedThings), note: orAbsent(text(500)) },
  'defect-found': {
    zoneId: orNull(uuid),
    where: text(200),
    what: text(1_000, 1),
    recommended: orAbsent(text(1_000)),
  },
  'note-written': { text: text(4_000, 1) },
  left: {
    outcome: oneOf(words.visitOutcomes),
    why: orNull(oneOf(words.cutShortReasons)),
    present: oneOf(words.presences),
    signerName: orAbsent(text(120)),
    signaturePath: orAbsent(text(20_000)),
    nextSteps: orAbsent(text(2_000)),
  },
  'question-answered': { questionId: uuid, answer: text(4_000, 1) },
  corrected: { of: uuid, reason: text(1_000, 1), body: orNull(record) },
};

const checks: ReadonlyMap<string, Check> = new Map(
  Object.entries(shapes).map(([type, shape]) => [type, shaped(shape)]),
);

/** Whether a body is one of this entry type at its newest version. Used for the replacement bodies of corrections. */
export function bodyFits(type: string, body: Record<string, unknown>): boolean {
  return checks.get(type)?.(body) ?? false;
}
