import { line, type Line } from '@rimeward/field-log/testing/clean-visit';
import { testDrains, testPump, testSystem } from '@rimeward/field-log/testing/systems';
import { before, changed, clean, judge, without } from '../../testing/judge';
import { checkRule } from '../../testing/check-rule';

const inWinter = ({ body }: Line) => 'stage' in body && body.stage === 'winter';
const winter = (change: object) =>
  clean.map((one) => (inWinter(one) ? { ...one, body: { ...one.body, ...change } } : one));
const pumped = { system: testSystem({ pump: { id: testPump, place: 'Pump house' } }) };
const drain = (position: 'open' | 'closed', ranDry: boolean) =>
  line('drain-set', { drainId: testDrains.upstream, position, ranDry });

checkRule('valve-not-half-open', {
  finds: {
    'left closed': () => judge(winter({ position: 'closed' })),
    'a test cock left open': () =>
      judge(
        before('left', [
          line('valve-set', {
            valveId: 'test-cock-2',
            stage: 'winter',
            position: 'open',
            workedThrough: true,
          }),
        ]),
      ),
  },
  leaves: { 'closed while air is on': () => judge(clean) },
  params: { valve: 'shutoff-1', position: 'closed' },
});

checkRule('valve-not-recorded', {
  finds: { 'no winter position': () => judge(without(inWinter)) },
  leaves: {
    'still at work': () => judge(without(inWinter).slice(0, -1)),
    'an assembly without valves': () =>
      judge(without({ type: 'valve-set' }), {
        system: testSystem({ backflow: { ...testSystem().backflow, valves: [] } }),
      }),
  },
  params: { valve: 'shutoff-1' },
});

checkRule('valve-not-worked', {
  finds: { 'left half open at once': () => judge(winter({ workedThrough: false })) },
  leaves: { 'worked back and forth': () => judge(clean) },
  params: { valve: 'shutoff-1' },
});

checkRule('drain-left-open', {
  finds: { 'upstream drain open': () => judge(before('left', [drain('open', true)])) },
  leaves: {
    'opened, then closed': () => judge(before('left', [drain('open', true), drain('closed', true)])),
  },
  params: { drain: 'upstream', place: 'Basement' },
});

checkRule('drain-not-recorded', {
  finds: { 'no word of the drains': () => judge(without({ type: 'drain-set' })) },
  leaves: {
    'a system without drains': () =>
      judge(without({ type: 'drain-set' }), { system: testSystem({ drains: [] }) }),
  },
  params: { drain: 'upstream', place: 'Basement' },
});

checkRule('drain-not-dry', {
  finds: { 'water kept coming': () => judge(before('left', [drain('closed', false)])) },
  leaves: { 'ran dry': () => judge(clean) },
  params: { drain: 'upstream', place: 'Basement' },
});

checkRule('plug-not-refitted', {
  finds: {
    'left open': () => judge(changed('connection-plugged', { plugged: false })),
    'not recorded': () => judge(without({ type: 'connection-plugged' })),
  },
  leaves: {
    'no air was given': () =>
      judge(without(({ type }) => type === 'connection-plugged' || type === 'air-started')),
  },
  params: { how: 'said' },
});

checkRule('pump-not-drained', {
  finds: {
    'not drained': () =>
      judge(before('left', [line('pump-drained', { pumpId: testPump, drained: false })]), pumped),
    'not recorded': () => judge(clean, pumped),
  },
  leaves: {
    drained: () => judge(before('left', [line('pump-drained', { pumpId: testPump, drained: true })]), pumped),
    'no pump': () => judge(clean),
  },
  params: { how: 'said' },
});

checkRule('controller-still-on', {
  finds: {
    'still on': () => judge(changed('controller-set', { mode: 'still-on' })),
    'not recorded': () => judge(without({ type: 'controller-set' })),
  },
  leaves: { 'in rain mode': () => judge(changed('controller-set', { mode: 'rain' })) },
  params: { how: 'said' },
});
