import fc from 'fast-check';
import type { EntryBody, EntryType } from '../entry-types/registry';
import type { LogEntry } from '../entry/log-entry';
import * as words from '../words/words';
import { entry, photo, testId } from './builders';

/** Few ids, so that entries meet: the same zone, cycle, part or entry is named again and again. */
export const pool = {
  zones: [testId(11), testId(12), testId(13)],
  cycles: [testId(21), testId(22), testId(23), testId(24)],
  parts: [testId(31), testId(32)],
  drains: [testId(41), testId(42)],
  pump: testId(51),
  valves: ['shutoff-1', 'shutoff-2', 'test-cock-1', 'test-cock-2', '__proto__', 'constructor'],
  devices: [testId(1), testId(2), testId(3)],
} as const;

const zoneId = fc.constantFrom(...pool.zones);
const cycleId = fc.constantFrom(...pool.cycles);
const partId = fc.constantFrom(...pool.parts);
const said = fc.string({ minLength: 3, maxLength: 20 });
const maybe = fc.option(said, { nil: undefined });
const psi = fc.double({ min: 0, max: 500, noNaN: true });
const orNull = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: null });
const entryIds = pool.devices.flatMap((_, device) =>
  Array.from({ length: 12 }, (_unused, index) => testId((device + 1) * 10_000 + index + 1)),
);

/** A body that fits, for every entry type. `corrected` may carry a body that fits nothing. */
export const bodies: { readonly [T in EntryType]: fc.Arbitrary<EntryBody<T>> } = {
  arrived: fc.record({
    position: orNull(
      fc.record({
        latitude: fc.double({ min: -90, max: 90, noNaN: true }),
        longitude: fc.double({ min: -180, max: 180, noNaN: true }),
        accuracyM: fc.double({ min: 0, max: 5_000, noNaN: true }),
      }),
    ),
    airTemperatureF: orNull(fc.integer({ min: -60, max: 130 })),
    sky: orNull(fc.constantFrom(...words.skies)),
    crew: fc.array(fc.constantFrom(testId(900), testId(901)), { maxLength: 12 }),
    compressorId: orNull(fc.constant(testId(71))),
    hoseId: orNull(fc.constant(testId(72))),
    removalMethod: fc.constantFrom(...words.removalMethods),
  }),
  'cautions-read': fc.record({ card: said, language: fc.constantFrom(...words.cardLanguages) }),
  'damage-seen': fc.record({ where: said, what: said }),
  'part-looked-for': fc.record({
    partId,
    kind: fc.constantFrom(...words.sensitivePartKinds),
    outcome: fc.constantFrom(...words.partOutcomes),
    note: maybe,
  }),
  'part-protected': fc.record({
    partId,
    kind: fc.constantFrom(...words.sensitivePartKinds),
    how: fc.constantFrom(...words.partProtections),
    keptWhere: orNull(fc.constantFrom(...words.keepingPlaces)),
    keptNote: maybe,
    reason: maybe,
  }),
  'photographs-added': fc.record({
    subject: orNull(fc.constantFrom(...pool.parts, ...pool.valves, ...entryIds)),
    caption: maybe,
  }),
  'water-off': fc.record({ kind: fc.constantFrom(...words.waterOffKinds), note: maybe }),
  'pressure-relieved': fc.record({ zoneId: orNull(zoneId) }),
  'valve-set': fc.record({
    valveId: fc.constantFrom(...pool.valves),
    stage: fc.constantFrom(...words.valveStages),
    position: fc.constantFrom(...words.valvePositions),
    workedThrough: fc.boolean(),
    note: maybe,
  }),
  'air-connected': fc.record({
    place: fc.constantFrom(...words.connectionPlaces),
    downstreamOfBackflow: fc.boolean(),
    couplingsPinned: fc.boolean(),
  }),
  'regulator-set': fc.record({ pressurePsi: psi }),
  'people-clear': fc.record({ areaClear: fc.boolean(), eyesAndEars: fc.boolean() }),
  'interlock-passed': fc.record({
    interlock: fc.constantFrom('water-off', 'people-clear', 'couplings-pinned', 'zone-open', 'no such lock'),
    reason: said,
  }),
  'zone-opened': fc.record({ zoneId }),
  'zone-closed': fc.record({ zoneId }),
  'air-started': fc.record({ cycleId, zoneId, gaugePsi: orNull(psi) }),
  'air-stopped': fc.record({ cycleId, elapsedMs: orNull(fc.nat({ max: 600_000 })) }),
  'end-sign-seen': fc.record({ cycleId, sign: fc.constantFrom(...words.endSigns) }),
  'gauge-read': fc.record({ cycleId: orNull(cycleId), pressurePsi: psi }),
  'heads-seen': fc.record({ zoneId, what: said }),
  'zone-skipped': fc.record({ zoneId, reason: said }),
  'air-closed-down': fc.record({ step: fc.constantFrom(...words.closeDownSteps) }),
  'drain-set': fc.record({
    drainId: fc.constantFrom(...pool.drains),
    ranDry: fc.boolean(),
    position: fc.constantFrom(...words.drainPositions),
  }),
  'pump-drained': fc.record({ pumpId: fc.constant(pool.pump), drained: fc.boolean() }),
  'connection-plugged': fc.record({ plugged: fc.boolean() }),
  'controller-set': fc.record({ mode: fc.constantFrom(...words.controllerModes) }),
  insulated: fc.record({ what: fc.constantFrom(...words.insulatedThings), note: maybe }),
  'defect-found': fc.record({ zoneId: orNull(zoneId), where: said, what: said, recommended: maybe }),
  'note-written': fc.record({ text: said }),
  left: fc.record({
    outcome: fc.constantFrom(...words.visitOutcomes),
    why: orNull(fc.constantFrom(...words.cutShortReasons)),
    present: fc.constantFrom(...words.presences),
    signerName: maybe,
    signaturePath: maybe,
    nextSteps: maybe,
  }),
  'question-answered': fc.record({ questionId: fc.constant(testId(81)), answer: said }),
  corrected: fc.record({
    of: fc.constantFrom(...entryIds),
    reason: said,
    body: orNull(
      fc.oneof(
        fc.record({ zoneId }) as fc.Arbitrary<Record<string, unknown>>,
        fc.record({ kind: fc.constantFrom(...words.waterOffKinds) }),
        fc.record({ cycleId, sign: fc.constantFrom(...words.endSigns) }),
        fc.record({ of: fc.constantFrom(...entryIds), reason: said, body: fc.constant(null) }),
        fc.dictionary(fc.string(), fc.jsonValue()),
      ),
    ),
  }),
};

const anyBody: fc.Arbitrary<{ type: EntryType; body: EntryBody<EntryType> }> = fc.oneof(
  ...Object.entries(bodies).map(([type, arbitrary]) =>
    (arbitrary as fc.Arbitrary<EntryBody<EntryType>>).map((body) => ({ type: type as EntryType, body })),
  ),
);

/** What happened on one visit, written by up to three phones with doubtful clocks; device and number are unique. */
export const visitLogs: fc.Arbitrary<LogEntry[]> = fc
  .array(
    fc.record({
      what: anyBody,
      device: fc.constantFrom(...pool.devices),
      minute: fc.oneof(fc.integer({ min: 0, max: 240 }), fc.constantFrom(-30_000_000, 1_000_000)),
      photos: fc.array(fc.integer({ min: 1, max: 4 }).map(photo), { maxLength: 2 }),
    }),
    { maxLength: 36 },
  )
  .map((facts) => {
    const heads = new Map<string, number>();
    return facts.map(({ what, device, minute, photos }) => {
      const seq = (heads.get(device) ?? 0) + 1;
      heads.set(device, seq);
      return entry(what.type, what.body, { device, seq, minute, photos });
    });
  });
