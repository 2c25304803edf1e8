import { describe, expect, it } from 'vitest';
import { testId } from '@rimeward/field-log/testing';
import { line } from '@rimeward/field-log/testing/clean-visit';
import { testSystem, testZone } from '@rimeward/field-log/testing/systems';
import { before, changed, clean, judge, late, without } from '../../testing/judge';
import { checkRule } from '../../testing/check-rule';

const first = { zoneNumber: 1, zoneName: 'Zone 1' };
const run = { id: 'run', nominalIn: 1, lengthFt: 60, ratedPsi: null, guessed: false };
const mixed = testSystem({
  zones: [testZone(1, { laterals: [{ ...run, material: 'pe-sidr15' }] }), testZone(2)],
});
const readAt = (gaugePsi: number | null) => changed('air-started', { gaugePsi });

checkRule('over-ceiling', {
  finds: {
    'rigid pipe over 80 psi': () => judge(readAt(84)),
    'polyethylene on the way, over 50 psi': () => judge(readAt(52), { system: mixed }),
    'over the cap of the company': () =>
      judge(readAt(62), { settings: { pressureCapPsi: 60, forbidsWorkingAlone: false } }),
    'over the lowest rated part': () =>
      judge(readAt(45), {
        system: testSystem({
          zones: [testZone(1, { lowestRatedPart: { name: 'Drip filter', ratedPsi: 40 } }), testZone(2)],
        }),
      }),
    'pipe that nobody knows, over 50 psi': () =>
      judge(readAt(55), {
        system: testSystem({ mainLine: [], zones: [testZone(1, { laterals: [] }), testZone(2)] }),
      }),
    'over a ceiling that was worked out': () =>
      judge(readAt(47), { ceilingByZone: { [testId(11)]: { pressurePsi: 45, setBy: 'pipe-rating' } } }),
    'read between, without naming the cycle': () =>
      judge(before('air-stopped', [line('gauge-read', { cycleId: null, pressurePsi: 90 })])),
  },
  leaves: {
    'at the ceiling': () => judge(readAt(80)),
    'within half a division of the gauge': () => judge(readAt(81)),
    'rigid pipe at 52 psi': () => judge(readAt(52)),
    'read high with no air on': () =>
      judge(before('left', [line('gauge-read', { cycleId: null, pressurePsi: 120 })])),
  },
  params: {
    ...first,
    pressurePsi: 84,
    ceilingPsi: 80,
    overPsi: 4,
    airSeconds: 120,
    setBy: 'rigid-pvc',
  },
});

checkRule('regulator-over-ceiling', {
  finds: {
    'set over the ceiling of a zone': () =>
      judge(changed('regulator-set', { pressurePsi: 60 }), { system: mixed }),
    'raised between two zones': () => {
      const at = clean.findIndex((one) => one.type === 'end-sign-seen') + 1;
      return judge([...clean.slice(0, at), line('regulator-set', { pressurePsi: 95 }), ...clean.slice(at)]);
    },
  },
  leaves: {
    'set high, and lowered before the air': () =>
      judge(before('regulator-set', [line('regulator-set', { pressurePsi: 120 })])),
    'set half a division over the ceiling': () =>
      judge(changed('regulator-set', { pressurePsi: 51 }), { system: mixed }),
    'raised after the last air': () => judge(before('left', [line('regulator-set', { pressurePsi: 120 })])),
  },
  params: { ...first, pressurePsi: 60, ceilingPsi: 50, setBy: 'polyethylene' },
});

checkRule('regulator-not-recorded', {
  finds: {
    never: () => judge(without({ type: 'regulator-set' })),
    'only afterwards': () => judge(late('regulator-set')),
  },
  leaves: {
    'no air': () => judge(without(({ type }) => type === 'regulator-set' || type === 'air-started')),
  },
  params: {},
});

checkRule('no-gauge-reading', {
  finds: { 'no cycle of the zone has a reading': () => judge(readAt(null)) },
  leaves: {
    'one reading in one cycle is enough': () => {
      const cycleIds = [testId(2_011), testId(2_021)];
      return judge(
        before(
          'left',
          cycleIds.map((cycleId) => line('gauge-read', { cycleId, pressurePsi: 45 })),
          readAt(null),
        ),
      );
    },
    'the cycle still runs': () =>
      judge(
        readAt(null).slice(
          0,
          clean.findIndex((one) => one.type === 'air-stopped'),
        ),
      ),
  },
  params: first,
});

describe('a regulator over several ceilings', () => {
  it('is told once, for the zone with the lowest one', () => {
    const lower = {
      ...mixed,
      zones: [testZone(1), ...mixed.zones.slice(0, 1).map((one) => ({ ...one, id: testId(12), number: 2 }))],
    };
    const found = judge(changed('regulator-set', { pressurePsi: 90 }), { system: lower });
    const told = found.filter((one) => one.ruleId === 'regulator-over-ceiling');
    expect(told.map((one) => one.params)).toMatchObject([{ zoneNumber: 2, ceilingPsi: 50 }]);
  });
});
