import { testId } from '@rimeward/field-log/testing';
import { line, type Line } from '@rimeward/field-log/testing/clean-visit';
import { testSystem, testZone } from '@rimeward/field-log/testing/systems';
import { before, changed, clean, judge, system, without } from '../../testing/judge';
import { checkRule } from '../../testing/check-rule';

const first = { zoneNumber: 1, zoneName: 'Zone 1' };
const [zoneOne = '', zoneTwo = ''] = system.zones.map((zone) => zone.id);
const lastCycles = new Set([testId(2_012), testId(2_022)]);
const inCycles = (ids: ReadonlySet<string>) => (one: Line) =>
  'cycleId' in one.body && one.body.cycleId !== null && ids.has(one.body.cycleId);
const oneCycleEach = without(inCycles(lastCycles));
const zoneOneCycles = new Set([testId(2_011), testId(2_012)]);
const withoutZoneOne = without(inCycles(zoneOneCycles));
const skipped = line('zone-skipped', { zoneId: zoneOne, reason: 'valve is stuck' });
const plan = { order: [zoneOne, zoneTwo], airSecondsByZone: { [zoneOne]: 120, [zoneTwo]: 120 } };
const third = (sign: 'dry' | 'mist', wait = 2): Line[] => [
  line('air-started', { cycleId: testId(2_013), zoneId: zoneOne, gaugePsi: 45 }, { wait }),
  line('air-stopped', { cycleId: testId(2_013), elapsedMs: 30_000 }),
  line('end-sign-seen', { cycleId: testId(2_013), sign }, { wait: 0 }),
];
const lasting = (elapsedMs: number) => changed('air-stopped', { elapsedMs });
const drips = testSystem({ zones: [testZone(1, { headKind: 'drip' }), testZone(2, { headKind: 'drip' })] });

checkRule('too-few-cycles', {
  finds: { 'one cycle a zone': () => judge(oneCycleEach) },
  leaves: {
    'still at work': () => judge(oneCycleEach.slice(0, -1)),
    'skipped after one cycle, which another rule tells': () =>
      judge(
        before('left', [skipped, line('zone-skipped', { zoneId: zoneTwo, reason: 'dog' })], oneCycleEach),
      ),
    'the company asks for fewer than two': () =>
      judge(clean, {
        settings: { pressureCapPsi: null, forbidsWorkingAlone: false, thresholds: { cyclesPerZone: 1 } },
      }),
  },
  params: { ...first, cycles: 1, wanted: 2 },
});

checkRule('zone-without-air', {
  finds: { 'a zone passed over in silence': () => judge(withoutZoneOne) },
  leaves: {
    'skipped with a reason': () => judge(before('left', [skipped], withoutZoneOne)),
    'drained by hand': () => judge(changed('arrived', { removalMethod: 'manual-drain' }, withoutZoneOne)),
  },
  params: first,
});

checkRule('zone-skipped', {
  finds: { 'skipped with a reason': () => judge(before('left', [skipped], withoutZoneOne)) },
  leaves: { 'blown out': () => judge(clean) },
  params: { ...first, reason: 'valve is stuck' },
});

checkRule('never-dry', {
  finds: { 'spitting to the end': () => judge(changed('end-sign-seen', { sign: 'spitting' })) },
  leaves: {
    'mist at the end': () => judge(clean),
    'dry at the end': () => judge(changed('end-sign-seen', { sign: 'dry' })),
  },
  params: { ...first, sign: 'spitting' },
});

checkRule('end-sign-missing', {
  finds: { 'no sign written': () => judge(without({ type: 'end-sign-seen' })) },
  leaves: {
    'skipped after all': () =>
      judge(
        before(
          'left',
          [skipped, line('zone-skipped', { zoneId: zoneTwo, reason: 'dog' })],
          without({ type: 'end-sign-seen' }),
        ),
      ),
    'a zone without any air': () =>
      judge(without(inCycles(new Set([...zoneOneCycles, testId(2_021), testId(2_022)])))),
    'a sign in the last cycle alone': () =>
      judge(without((one) => one.type === 'end-sign-seen' && !inCycles(lastCycles)(one))),
  },
  params: first,
});

checkRule('cycle-too-long', {
  finds: {
    'three minutes through spray heads': () => judge(lasting(180_000)),
    'over a cap that was worked out': () =>
      judge(clean, { plan: { ...plan, capSecondsByZone: { [zoneOne]: 40 } } }),
  },
  leaves: {
    'at the cap, with a late thumb': () => judge(lasting(130_000)),
    'three minutes through drip': () => judge(lasting(180_000), { system: drips }),
    'a quarter of an hour, which another rule tells': () => judge(lasting(900_000)),
  },
  params: { ...first, seconds: 180, capSeconds: 120 },
});

checkRule('air-unattended', {
  finds: { 'a quarter of an hour': () => judge(lasting(900_000)) },
  leaves: {
    'three minutes': () => judge(lasting(180_000)),
    'ten minutes, the border itself': () => judge(lasting(600_000)),
  },
  params: { ...first, seconds: 900 },
});

checkRule('rest-too-short', {
  finds: { 'half a minute': () => judge(before('air-closed-down', [...zoneAgain(0.5)])) },
  leaves: {
    'two minutes': () => judge(before('air-closed-down', [...zoneAgain(2)])),
    'a minute, the border itself': () => judge(before('air-closed-down', [...zoneAgain(1)])),
  },
  params: { zoneNumber: 2, zoneName: 'Zone 2', seconds: 30, wantedSeconds: 60 },
});

/** Zone 2 ends the clean visit; its air goes on once more after a rest. */
function zoneAgain(wait: number): Line[] {
  return third('mist', wait).map((one) => ({
    ...one,
    body: 'zoneId' in one.body ? { ...one.body, zoneId: zoneTwo } : one.body,
  }));
}

checkRule('air-after-dry', {
  finds: {
    'a third cycle after dry': () =>
      judge(before('air-closed-down', third('dry'), changed('end-sign-seen', { sign: 'dry' }))),
  },
  leaves: {
    'a third cycle after mist': () => judge(before('air-closed-down', third('dry'))),
  },
  params: { ...first, seconds: 90 },
});

checkRule('order-against-plan', {
  finds: { 'the second zone first': () => judge(clean, { plan: { ...plan, order: [zoneTwo, zoneOne] } }) },
  leaves: {
    'as planned': () => judge(clean, { plan }),
    'no plan': () => judge(clean),
    'a zone without air does not shift the others': () => judge(withoutZoneOne, { plan }),
  },
  params: { ...first, plannedPlace: 2, place: 1 },
});

checkRule('air-against-water', {
  finds: {
    'two minutes where five are called for': () =>
      judge(clean, { plan: { ...plan, airSecondsByZone: { [zoneOne]: 300 } } }),
    'two minutes where ten seconds would do': () =>
      judge(clean, { plan: { ...plan, airSecondsByZone: { [zoneOne]: 10 } } }),
  },
  leaves: {
    'about as much as called for': () => judge(clean, { plan }),
    'half of it, the border itself': () =>
      judge(clean, { plan: { ...plan, airSecondsByZone: { [zoneOne]: 240 } } }),
    'six times as much, the border itself': () =>
      judge(clean, { plan: { ...plan, airSecondsByZone: { [zoneOne]: 20 } } }),
    'skipped in the end': () =>
      judge(before('left', [skipped]), { plan: { ...plan, airSecondsByZone: { [zoneOne]: 900 } } }),
    'not worked out': () => judge(clean, { plan: { ...plan, airSecondsByZone: { [zoneOne]: null } } }),
  },
  params: { ...first, airSeconds: 120, expectedSeconds: 300, how: 'too-little' },
});
