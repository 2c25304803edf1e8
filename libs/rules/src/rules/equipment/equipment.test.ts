import { testId } from '@rimeward/field-log/testing';
import { line } from '@rimeward/field-log/testing/clean-visit';
import { before, changed, clean, judge, without } from '../../testing/judge';
import { checkRule } from '../../testing/check-rule';

const zoneId = testId(11);
const burst = (number: number) => [
  line('air-started', { cycleId: testId(3_000 + number), zoneId, gaugePsi: 45 }),
  line('air-stopped', { cycleId: testId(3_000 + number), elapsedMs: 6_000 }),
];
const bursts = [1, 2, 3].flatMap(burst);
const planned = (verdict: 'suitable' | 'slow' | 'too-small') => ({
  plan: { order: [], airSecondsByZone: {}, compressor: { name: 'Small towed', verdict } },
});

checkRule('compressor-not-recorded', {
  finds: {
    'none chosen on arrival': () => judge(changed('arrived', { compressorId: null })),
    'no arrival': () => judge(without({ type: 'arrived' })),
  },
  leaves: {
    chosen: () => judge(clean),
    'no air': () => judge(changed('arrived', { compressorId: null }, without({ type: 'air-started' }))),
  },
  params: {},
});

checkRule('compressor-too-small', {
  finds: { 'judged too small': () => judge(clean, planned('too-small')) },
  leaves: {
    slow: () => judge(clean, planned('slow')),
    'no air': () => judge(without({ type: 'air-started' }), planned('too-small')),
  },
  params: { compressor: 'Small towed' },
});

checkRule('tank-burst-pattern', {
  finds: { 'three bursts of six seconds': () => judge(before('air-closed-down', bursts)) },
  leaves: {
    'two short cycles after two whole ones': () => judge(before('air-closed-down', bursts.slice(0, 4))),
  },
  params: { zoneNumber: 1, zoneName: 'Zone 1', cycles: 3, seconds: 6 },
});
