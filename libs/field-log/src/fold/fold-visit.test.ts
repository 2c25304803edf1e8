import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { entry, photo, testId } from '../testing/builders';
import { foldVisit } from './fold-visit';

const zone = testId(11);
const cycle = testId(21);
const lead = testId(1);
const helper = testId(2);

const visit = [
  entry('water-off', { kind: 'shutoff-closed' }, { seq: 1 }),
  entry('air-started', { cycleId: cycle, zoneId: zone, gaugePsi: 50 }, { seq: 2, minute: 10 }),
  entry('gauge-read', { cycleId: cycle, pressurePsi: 48 }, { device: helper, seq: 1, minute: 11 }),
  entry('air-stopped', { cycleId: cycle, elapsedMs: null }, { seq: 3, minute: 12 }),
  entry('end-sign-seen', { cycleId: cycle, sign: 'mist' }, { device: helper, seq: 2, minute: 12 }),
  entry(
    'part-protected',
    { partId: testId(31), kind: 'flow-sensor', how: 'removed-blank', keptWhere: 'truck' },
    { seq: 4, photos: [photo(1)] },
  ),
  entry('corrected', { of: testId(10_001), reason: 'slip', body: { kind: 'was-closed' } }, { seq: 5 }),
];

describe('fold of a visit', () => {
  it('puts a cycle together from two phones', () => {
    const state = foldVisit(visit);
    const [first] = state.zones[zone]?.cycles ?? [];
    expect(first).toMatchObject({ durationMs: 120_000, durationFrom: 'wall-clock', endSign: 'mist' });
    expect(first?.gaugeReadings.map((reading) => reading.pressurePsi)).toEqual([50, 48]);
    expect(state.airOn).toBe(false);
    expect(state.devices).toEqual([lead, helper]);
  });

  it('gives the same state for every arrival order, and for entries given twice', () => {
    const expected = foldVisit(visit);
    fc.assert(
      fc.property(
        fc.shuffledSubarray(visit, { minLength: visit.length }),
        fc.subarray(visit),
        (shuffled, again) => {
          expect(foldVisit([...again, ...shuffled])).toEqual(expected);
        },
      ),
    );
  });

  it('keeps the corrected entry and its correction, and reads the new body', () => {
    const state = foldVisit(visit);
    expect(state.waterOff?.kind).toBe('was-closed');
    expect(state.entries).toHaveLength(visit.length);
    expect(state.entries.find((one) => one.entry.type === 'water-off')?.corrections).toHaveLength(1);
  });

  it('brings an entry back when its withdrawal is withdrawn', () => {
    const withdrawn = entry('corrected', { of: testId(10_001), reason: 'slip', body: null }, { seq: 2 });
    const back = entry('corrected', { of: withdrawn.id, reason: 'it was right', body: null }, { seq: 3 });
    const first = entry('water-off', { kind: 'shutoff-closed' }, { seq: 1 });
    expect(foldVisit([first, withdrawn]).waterOff).toBeNull();
    expect(foldVisit([back, withdrawn, first]).waterOff?.kind).toBe('shutoff-closed');
  });

  it('leaves the entry as it was when the new body is not one of its type', () => {
    const first = entry('water-off', { kind: 'shutoff-closed' }, { seq: 1 });
    const odd = entry('corrected', { of: first.id, reason: 'oops', body: { kind: 'half' } }, { seq: 2 });
    expect(foldVisit([first, odd]).entries[0]?.standing).toBe('standing');
    expect(foldVisit([first, odd]).waterOff?.kind).toBe('shutoff-closed');
  });

  it('does not turn a device round when its clock is set back', () => {
    const before = entry('regulator-set', { pressurePsi: 60 }, { seq: 1, minute: 30 });
    const after = entry('regulator-set', { pressurePsi: 45 }, { seq: 2, minute: -180 });
    expect(foldVisit([after, before]).regulator?.pressurePsi).toBe(45);
  });

  it('does not lose or invent air when a stop has no start', () => {
    const state = foldVisit([entry('air-stopped', { cycleId: cycle, elapsedMs: 5 }, { seq: 1 })]);
    expect(state.airOn).toBe(false);
    expect(Object.keys(state.zones)).toEqual([]);
  });

  it('closes the zone when its air stops and keeps a zone open that another cycle holds', () => {
    const other = testId(12);
    const started = [
      entry('air-started', { cycleId: cycle, zoneId: zone, gaugePsi: null }, { seq: 1 }),
      entry('air-started', { cycleId: testId(22), zoneId: other, gaugePsi: null }, { seq: 2 }),
      entry('air-stopped', { cycleId: cycle, elapsedMs: 60_000 }, { seq: 3 }),
    ];
    const state = foldVisit(started);
    expect([state.zones[zone]?.open, state.zones[other]?.open, state.airOn]).toEqual([false, true, true]);
  });

  it('ties photographs to the part they show', () => {
    expect(foldVisit(visit).parts[testId(31)]?.photos).toEqual([photo(1)]);
  });

  it("does not leave a zone open when the helper's clock puts the stop before the start", () => {
    const state = foldVisit([
      entry('air-started', { cycleId: cycle, zoneId: zone, gaugePsi: null }, { seq: 1, minute: 10 }),
      entry('air-stopped', { cycleId: cycle, elapsedMs: null }, { device: helper, seq: 1, minute: 8 }),
    ]);
    expect(state.zones[zone]).toMatchObject({ open: false, cycles: [{ durationMs: 0 }] });
    expect(state.airOn).toBe(false);
  });

  it('ties later photographs to the damage and the defect that they show', () => {
    const damage = entry('damage-seen', { where: 'gate', what: 'cracked' }, { seq: 1 });
    const later = entry('photographs-added', { subject: damage.id }, { seq: 2, photos: [photo(7)] });
    expect(foldVisit([damage, later]).damageSeen[0]?.photos).toEqual([photo(7)]);
  });

  it('keeps standing upright when ids are called like members that every object inherits', () => {
    const odd = ['__proto__', 'constructor', 'toString'].map((valveId, index) =>
      entry(
        'valve-set',
        { valveId, stage: 'winter', position: 'half-open', workedThrough: true },
        { seq: index + 1 },
      ),
    );
    const subject = entry('photographs-added', { subject: 'hasOwnProperty' }, { seq: 9, photos: [photo(1)] });
    const state = foldVisit([...odd, subject]);
    expect(Object.keys(state.valves)).toEqual(['__proto__', 'constructor', 'toString']);
    expect('winter' in {}).toBe(false);
  });
});
