import { describe, expect, it } from 'vitest';
import { testId } from '@rimeward/field-log/testing';
import type { RuleId, RuleParams } from '../finding/rule-params';
import { changed, clean, judge } from '../testing/judge';
import type { Reader } from './say';
import { sentence } from './sentence';

const zone = { zoneNumber: 3, zoneName: 'Back lawn' };
const device = testId(1);
const person = testId(900);

const samples: { readonly [T in RuleId]: RuleParams[T][] } = {
  'people-not-clear': [{ how: 'never' }, { how: 'late' }],
  'couplings-not-pinned': [{}],
  'cautions-not-read': [{}],
  'interlock-passed': [{ interlock: 'pressure-relieved', reason: 'gauge at zero' }],
  'air-before-water-off': [
    { how: 'never', ...zone },
    { how: 'late', ...zone },
  ],
  'air-before-relief': [
    { how: 'never', ...zone },
    { how: 'late', ...zone },
  ],
  'air-before-sensitive-part': [{ part: 'flow-sensor' }],
  'sensitive-part-left': [{ part: 'pump', reason: '' }],
  'sensitive-part-unknown': [
    { part: 'filter', how: 'not-found' },
    { part: 'filter', how: 'not-looked-for' },
    { part: 'filter', how: 'not-protected' },
  ],
  'air-through-backflow': [{ place: 'test-cock' }],
  'air-with-backflow-open': [
    { valve: 'shutoff-1', how: 'open' },
    { valve: 'shutoff-2', how: 'not-recorded' },
  ],
  'connection-not-recorded': [{}],
  'no-zone-open': [zone],
  'over-ceiling': [
    { ...zone, pressurePsi: 84, ceilingPsi: 80, overPsi: 4, airSeconds: 120, setBy: 'rigid-pvc' },
    { ...zone, pressurePsi: 84, ceilingPsi: 50, overPsi: 34, airSeconds: 0, setBy: 'unknown' },
  ],
  'regulator-over-ceiling': [{ ...zone, pressurePsi: 60, ceilingPsi: 50, setBy: 'polyethylene' }],
  'regulator-not-recorded': [{}],
  'no-gauge-reading': [zone],
  'visit-cut-short': [
    { why: 'weather', zonesLeft: 2 },
    { why: 'no-shutoff', zonesLeft: 1 },
  ],
  'zone-without-air': [zone],
  'zone-skipped': [{ ...zone, reason: 'valve is stuck' }],
  'too-few-cycles': [{ ...zone, cycles: 1, wanted: 2 }],
  'never-dry': [{ ...zone, sign: 'spitting' }],
  'end-sign-missing': [zone],
  'air-unattended': [{ ...zone, seconds: 900 }],
  'cycle-too-long': [{ ...zone, seconds: 195, capSeconds: 120 }],
  'air-after-dry': [{ ...zone, seconds: 45 }],
  'tank-burst-pattern': [{ ...zone, cycles: 4, seconds: 6 }],
  'rest-too-short': [{ ...zone, seconds: 20, wantedSeconds: 60 }],
  'air-against-water': [
    { ...zone, airSeconds: 60, expectedSeconds: 300, how: 'too-little' },
    { ...zone, airSeconds: 900, expectedSeconds: 60, how: 'too-much' },
  ],
  'order-against-plan': [{ ...zone, plannedPlace: 1, place: 4 }],
  'compressor-too-small': [{ compressor: 'Small towed' }],
  'compressor-not-recorded': [{}],
  'air-never-stopped': [zone],
  'stop-without-start': [{}],
  'hose-off-under-pressure': [{}],
  'close-down-incomplete': [{ steps: 1 }, { steps: 2 }],
  'valve-not-half-open': [{ valve: 'test-cock-2', position: 'closed' }],
  'valve-not-recorded': [{ valve: 'vent-screw-1' }],
  'valve-not-worked': [{ valve: 'shutoff-1' }],
  'pump-not-drained': [{ how: 'said' }, { how: 'not-recorded' }],
  'drain-left-open': [{ drain: 'upstream', place: 'Basement' }],
  'drain-not-dry': [{ drain: 'manual', place: '' }],
  'drain-not-recorded': [{ drain: 'automatic', place: 'Low corner' }],
  'plug-not-refitted': [{ how: 'said' }, { how: 'not-recorded' }],
  'controller-still-on': [{ how: 'said' }, { how: 'not-recorded' }],
  'part-kept-nowhere': [{ part: 'submeter' }],
  'part-without-photo': [{ part: 'flow-meter' }],
  'backflow-without-photo': [{}],
  'damage-without-photo': [{ where: 'gate' }],
  'defect-without-photo': [{ where: 'bed' }],
  'photo-used-twice': [
    { sha256: 'f', visits: 1 },
    { sha256: 'f', visits: 3 },
  ],
  'photo-far-from-site': [{ sha256: 'f', distanceM: 1_000 }],
  'photo-taken-earlier': [{ sha256: 'f', hours: 26 }],
  'photo-from-gallery': [{ photos: 1 }, { photos: 2 }],
  'correction-ignored': [{}],
  'chain-broken': [{ device, seq: 7 }],
  'device-gap': [
    { device, missing: 1 },
    { device, missing: 4 },
  ],
  'two-places-at-once': [{ person, elsewhere: 'Mill Park', minutes: 30 }],
  'visit-shorter-than-air': [{ visitSeconds: 600, airSeconds: 3_600 }],
  'clock-set-back': [
    { device, minutes: 180, times: 1 },
    { device, minutes: 5, times: 3 },
  ],
  'clock-implausible': [
    { device, entries: 1 },
    { device, entries: 9 },
  ],
  'clock-changed': [{ device, minutes: 60 }],
  'not-signed-off': [{ person }],
  'working-alone': [{ person }],
};

const all = Object.entries(samples).flatMap(([ruleId, list]) =>
  list.map((params) => ({ ruleId, severity: 'fault' as const, entryIds: [], params: { ...params } })),
);
const metric: Reader = { units: 'metric', metricPressure: 'kPa' };

describe('sentences', () => {
  it.each(all)('of $ruleId are whole in both languages', (finding) => {
    const said = [sentence(finding, 'en'), sentence(finding, 'es')];
    for (const text of said) {
      expect(text).toMatch(/^[\p{Lu}¿\d].*[.]$|: gauge at zero$|: valve is stuck$/u);
      expect(text).not.toMatch(/undefined|NaN|\[object|null|[a-z]-[a-z]+-\d| {2}/);
    }
    expect(said[0]).not.toBe(said[1]);
  });

  it('say whose ceiling was passed, by how much and for how long', () => {
    const [finding] = judge(changed('air-started', { gaugePsi: 84 }));
    expect(finding && sentence(finding, 'en')).toBe(
      'The gauge read 84 psi in zone 1, 4 psi over its ceiling of 80 psi set by rigid pipe, in cycles of 2 min together.',
    );
    expect(finding && sentence(finding, 'es')).toBe(
      'El manómetro marcó 84 psi en la zona 1 (Zone 1), 4 psi sobre su tope de 80 psi, que pone el tubo rígido, en ciclos de 2 min en total.',
    );
  });

  it('take the units of the reader (50 psi is 344.73786 kPa by GNU units)', () => {
    const finding = { ruleId: 'regulator-over-ceiling', severity: 'fault' as const, entryIds: [] };
    const params = { ...zone, pressurePsi: 50, ceilingPsi: 40, setBy: 'company-cap' };
    expect(sentence({ ...finding, params }, 'en', metric)).toContain('345 kPa');
    expect(sentence({ ...finding, params }, 'en', { units: 'metric', metricPressure: 'bar' })).toContain(
      '3.4 bar',
    );
    const far = { ruleId: 'photo-far-from-site', severity: 'gap' as const, entryIds: [] };
    const distance = { sha256: 'f', distanceM: 304.8 };
    expect(sentence({ ...far, params: distance }, 'en')).toContain('1000 ft');
    expect(sentence({ ...far, params: distance }, 'es', metric)).toContain('305 m');
  });

  it('name a person only to readers who may know the name', () => {
    const finding = {
      ruleId: 'not-signed-off',
      severity: 'fault' as const,
      entryIds: [],
      params: { person },
    };
    expect(sentence(finding, 'en')).toMatch(/^Somebody on the crew/);
    const nameOf = (id: string) => (id === person ? 'Ana Invented' : undefined);
    expect(sentence(finding, 'es', { ...metric, nameOf })).toMatch(/^Ana Invented /);
  });

  it('name a rule of another version by its id', () => {
    const old = { ruleId: 'constructor', severity: 'note' as const, entryIds: [], params: {} };
    expect(sentence(old, 'en')).toContain('constructor');
    expect(sentence(old, 'es')).toContain('constructor');
  });

  it('exist for everything found in a visit cut in half', () => {
    for (const finding of judge(clean.slice(0, 20), { atTheEnd: true })) {
      expect(sentence(finding, 'es').length).toBeGreaterThan(20);
    }
  });
});
