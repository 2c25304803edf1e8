import { testId } from '@rimeward/field-log/testing';
import type { LogEntry } from '@rimeward/field-log';
import { line, written, type Line } from '@rimeward/field-log/testing/clean-visit';
import { describe, expect, it } from 'vitest';
import { testParts, testPump, testSystem } from '@rimeward/field-log/testing/systems';
import { before, changed, clean, judge, judgeLog, late, without } from '../../testing/judge';
import { checkRule } from '../../testing/check-rule';

const first = { zoneNumber: 1, zoneName: 'Zone 1' };
const zoneId = testId(11);
const openValve = line('valve-set', {
  valveId: 'shutoff-1',
  stage: 'before-air',
  position: 'open',
  workedThrough: false,
});
const log = written(clean);
const stopAt = clean.findIndex((one) => one.type === 'air-stopped');
const minuteOfFirstStop = clean.slice(0, stopAt + 1).reduce((sum, one) => sum + one.wait, 0);
const unmeasured = (one: LogEntry): LogEntry => ({ ...one, time: { ...one.time, offsetMs: null } });
const sensor = { partId: testParts.sensor, kind: 'flow-sensor' } as const;

checkRule('air-before-water-off', {
  finds: {
    'water never off': () => judge(without({ type: 'water-off' })),
    'water off after the first air': () => judge(late('water-off')),
  },
  leaves: {
    'water off in time, and said again after the air': () =>
      judge(before('left', [line('water-off', { kind: 'was-closed' })])),
    'water off by the helper, whose clock is two minutes ahead of nobody knows what': () => {
      const off = line('water-off', { kind: 'shutoff-closed' });
      const helper = written([off], { device: testId(2), firstMinute: minuteOfFirstStop });
      return judgeLog([...written(without({ type: 'water-off' })), ...helper].map(unmeasured));
    },
    'no air at all': () => judge(without(({ type }) => type === 'water-off' || type === 'air-started')),
  },
  params: { how: 'never', ...first },
});

checkRule('air-before-relief', {
  finds: {
    'pressure never relieved': () => judge(without({ type: 'pressure-relieved' })),
    'pressure relieved after the first air': () => judge(late('pressure-relieved')),
  },
  leaves: { 'relieved in time': () => judge(clean) },
  params: { how: 'never', ...first },
});

checkRule('air-before-sensitive-part', {
  finds: { 'sensor taken out last': () => judge(late('part-protected')) },
  leaves: {
    'sensor never protected, which another rule tells': () => judge(without({ type: 'part-protected' })),
    'sensor declared absent before the air': () =>
      judge(changed('part-looked-for', { outcome: 'none' }, without({ type: 'part-protected' }))),
  },
  params: { part: 'flow-sensor' },
});

checkRule('sensitive-part-left', {
  finds: {
    'sensor left with a reason': () => judge(changed('part-protected', { how: 'left', reason: 'seized' })),
    'a pump left in the way': () =>
      judge(
        changed(
          'part-protected',
          { how: 'left', kind: 'pump' },
          changed('part-looked-for', { kind: 'pump' }),
        ),
      ),
  },
  leaves: {
    'left, but no air was given': () =>
      judge(changed('part-protected', { how: 'left' }).filter((one) => one.type !== 'air-started')),
    bypassed: () => judge(changed('part-protected', { how: 'bypassed', keptWhere: null })),
  },
  params: { part: 'flow-sensor', reason: 'seized' },
});

checkRule('sensitive-part-unknown', {
  finds: {
    'nobody looked': () => judge(without(({ type }) => type.startsWith('part-'))),
    'found and not protected': () => judge(without({ type: 'part-protected' })),
    'not found': () =>
      judge(changed('part-looked-for', { outcome: 'not-found' }, without({ type: 'part-protected' }))),
  },
  leaves: {
    'nobody looked, and no air was given': () =>
      judge(without(({ type }) => type.startsWith('part-') || type === 'air-started')),
    'a part found on site and taken out': () =>
      judge(
        before('water-off', [
          line('part-protected', {
            ...sensor,
            partId: testId(77),
            how: 'removed-spool',
            keptWhere: 'customer',
          }),
        ]),
      ),
  },
  params: { part: 'flow-sensor', how: 'not-looked-for' },
});

checkRule('air-through-backflow', {
  finds: {
    'joined before the assembly': () => judge(changed('air-connected', { downstreamOfBackflow: false })),
    'joined at a test cock': () => judge(changed('air-connected', { place: 'test-cock' })),
    'moved to the wrong place between two cycles': () => {
      const at = clean.findIndex((one) => one.type === 'end-sign-seen') + 1;
      const wrong = { place: 'hose-bib', downstreamOfBackflow: false, couplingsPinned: true } as const;
      return judge([...clean.slice(0, at), line('air-connected', wrong), ...clean.slice(at)]);
    },
  },
  leaves: {
    'joined wrongly, and put right before the air': () => {
      const wrong = { place: 'hose-bib', downstreamOfBackflow: false, couplingsPinned: true } as const;
      return judge(before('air-connected', [line('air-connected', wrong)]));
    },
  },
  params: { place: 'blow-out-fitting' },
});

checkRule('connection-not-recorded', {
  finds: { 'no word of the hose': () => judge(without({ type: 'air-connected' })) },
  leaves: {
    'no air': () => judge(without(({ type }) => type === 'air-connected' || type === 'air-started')),
  },
  params: {},
});

checkRule('air-with-backflow-open', {
  finds: {
    'shutoffs not recorded': () =>
      judge(without(({ body }) => 'stage' in body && body.stage === 'before-air')),
    'one of two not recorded': () =>
      judge(
        without(({ body }) => 'stage' in body && body.stage === 'before-air' && body.valveId === 'shutoff-1'),
      ),
    'a shutoff open': () =>
      judge(clean.map((one) => ('stage' in one.body && one.body.stage === 'before-air' ? openValve : one))),
  },
  leaves: {
    'an assembly without shutoffs': () => {
      const plain = testSystem({ backflow: { ...testSystem().backflow, kind: 'none', valves: [] } });
      return judge(without({ type: 'valve-set' }), { system: plain });
    },
    'closed, then half open after the air': () => judge(clean),
  },
  params: { valve: 'shutoff-1', how: 'not-recorded' },
});

checkRule('no-zone-open', {
  finds: {
    'closed by the helper under air, clocks measured': () => {
      const closing = line('zone-closed', { zoneId }, { wait: 0 });
      const helper = written([closing], { device: testId(2), firstMinute: minuteOfFirstStop - 0.5 });
      return judgeLog([...log, ...helper]);
    },
    'a zone shut, opened again, and closed under the next air': () => {
      const added = [line('zone-opened', { zoneId }), line('zone-closed', { zoneId })];
      return judge([
        ...clean.slice(0, stopAt + 2),
        ...added,
        ...clean.slice(stopAt + 2, stopAt + 3),
        line('zone-closed', { zoneId: testId(12) }),
        ...clean.slice(stopAt + 3),
      ]);
    },
    'the only zone closed under air': () => judge(before('air-stopped', [line('zone-closed', { zoneId })])),
  },
  leaves: {
    'nothing closed by hand': () => judge(clean),
    'the next zone opened before the last is closed': () =>
      judge(
        before('air-stopped', [line('zone-opened', { zoneId: testId(12) }), line('zone-closed', { zoneId })]),
      ),
    'closed by the helper, whose clock is some minutes behind': () => {
      const closing = line('zone-closed', { zoneId }, { wait: 0 });
      const helper = written([closing], { device: testId(2), firstMinute: minuteOfFirstStop - 0.5 });
      return judgeLog([...log, ...helper].map(unmeasured));
    },
    'closed after the air was off': () => {
      const at = clean.findIndex((one) => one.type === 'air-stopped') + 1;
      return judge([...clean.slice(0, at), line('zone-closed', { zoneId }), ...clean.slice(at)]);
    },
  },
  params: first,
});

checkRule('air-never-stopped', {
  finds: {
    'left with a cycle running': () => {
      let seen = 0;
      return judge(without(({ type }) => type === 'air-stopped' && (seen += 1) === 1));
    },
  },
  leaves: {
    'still at work': () =>
      judge(
        clean.slice(
          0,
          clean.findIndex((one) => one.type === 'air-stopped'),
        ),
      ),
  },
  params: first,
});

checkRule('stop-without-start', {
  finds: {
    'a stop of an unknown cycle': () =>
      judge(before('left', [line('air-stopped', { cycleId: testId(99), elapsedMs: 1_000 })])),
  },
  leaves: { 'every stop has its start': () => judge(clean) },
  params: {},
});

checkRule('hose-off-under-pressure', {
  finds: {
    'bled after it came off': () =>
      judge(
        before(
          'left',
          [line('air-closed-down', { step: 'hose-bled' })],
          without(({ body }) => 'step' in body && body.step === 'hose-bled'),
        ),
      ),
  },
  leaves: {
    'bled first': () => judge(clean),
    'bled first, and once more at the end': () =>
      judge(before('left', [line('air-closed-down', { step: 'hose-bled' })])),
  },
  params: {},
});

checkRule('close-down-incomplete', {
  finds: {
    'hose never bled': () => judge(without(({ body }) => 'step' in body && body.step === 'hose-bled')),
  },
  leaves: {
    'still at work': () => judge(clean.slice(0, -9)),
    'all three recorded': () => judge(clean),
    'no air was given': () =>
      judge(without(({ type }) => type === 'air-started' || type === 'air-closed-down')),
  },
  params: { steps: 2 },
});

checkRule('visit-cut-short', {
  finds: {
    'no access to the back': () =>
      judge([
        ...clean.slice(0, 1),
        line('left', { outcome: 'cut-short', why: 'weather', present: 'nobody-present' }),
      ]),
  },
  leaves: {
    'left as done': () => judge(clean, { system: testSystem({ pump: { id: testPump, place: '' } }) }),
  },
  params: { why: 'weather', zonesLeft: 2 },
});

describe('severity', () => {
  const left = (kind: 'pump' | 'flow-sensor') =>
    judge(changed('part-protected', { how: 'left', kind }, changed('part-looked-for', { kind })), {
      system: testSystem({ sensitiveParts: [] }),
    }).find((one) => one.ruleId === 'sensitive-part-left')?.severity;
  const unknown = (outcome: 'found' | 'not-found') =>
    judge(changed('part-looked-for', { outcome }, without({ type: 'part-protected' })))
      .filter((one) => one.ruleId === 'sensitive-part-unknown')
      .map((one) => [one.severity, one.params]);

  it('of a pump in the way is a danger, of another part a fault', () => {
    expect([left('pump'), left('flow-sensor')]).toEqual(['danger', 'fault']);
  });

  it('of a part that was found and not protected is a fault, of one that was not found a gap', () => {
    expect(unknown('found')).toEqual([['fault', { part: 'flow-sensor', how: 'not-protected' }]]);
    expect(unknown('not-found')).toEqual([['gap', { part: 'flow-sensor', how: 'not-found' }]]);
  });
});

describe('a visit that was cut short', () => {
  it('counts the zones that still hold water', () => {
    const end = clean.findIndex((one) => one.type === 'air-closed-down');
    const cut = line('left', { outcome: 'cut-short', why: 'weather', present: 'nobody-present' });
    const zonesLeft = (lines: readonly Line[]) =>
      judge([...lines, cut]).flatMap((one) =>
        one.ruleId === 'visit-cut-short' ? [one.params.zonesLeft] : [],
      );
    expect(zonesLeft(clean.slice(0, end))).toEqual([0]);
    expect(zonesLeft(clean.slice(0, end - 3))).toEqual([1]);
    expect(zonesLeft(changed('end-sign-seen', { sign: 'dry' }, clean.slice(0, end)))).toEqual([0]);
  });
});
