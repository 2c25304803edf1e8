import { line, people } from '@rimeward/field-log/testing/clean-visit';
import { describe, expect, it } from 'vitest';
import { before, changed, clean, judge, late, without } from '../../testing/judge';
import { checkRule } from '../../testing/check-rule';

const alone = changed('arrived', { crew: [people.lead] });
const strict = { settings: { pressureCapPsi: null, forbidsWorkingAlone: true } };
const pass = (interlock: string) =>
  before('air-started', [line('interlock-passed', { interlock, reason: 'gauge at zero' })]);

checkRule('interlock-passed', {
  finds: { 'with a reason': () => judge(pass('pressure-relieved')) },
  leaves: { 'nothing passed': () => judge(clean) },
  params: { interlock: 'pressure-relieved', reason: 'gauge at zero' },
});

describe('an interlock that protects people', () => {
  it('is a danger when it was passed all the same', () => {
    expect(judge(pass('people-clear'))[0]).toMatchObject({ ruleId: 'interlock-passed', severity: 'danger' });
    expect(judge(pass('zone-open'))[0]).toMatchObject({ ruleId: 'interlock-passed', severity: 'fault' });
  });
});

checkRule('cautions-not-read', {
  finds: {
    never: () => judge(without({ type: 'cautions-read' })),
    'after the first air': () => judge(late('cautions-read')),
  },
  leaves: {
    'no air': () => judge(without(({ type }) => type === 'cautions-read' || type === 'air-started')),
  },
  params: {},
});

checkRule('people-not-clear', {
  finds: {
    never: () => judge(without({ type: 'people-clear' })),
    'ears not protected': () => judge(changed('people-clear', { eyesAndEars: false })),
    'after the first air': () => judge(late('people-clear')),
  },
  leaves: {
    'not clear at first, then clear, then air': () =>
      judge(before('people-clear', [line('people-clear', { areaClear: false, eyesAndEars: true })])),
  },
  params: { how: 'never' },
});

checkRule('couplings-not-pinned', {
  finds: { 'not pinned': () => judge(changed('air-connected', { couplingsPinned: false })) },
  leaves: {
    'no air': () =>
      judge(changed('air-connected', { couplingsPinned: false }, without({ type: 'air-started' }))),
  },
  params: {},
});

checkRule('not-signed-off', {
  finds: { withdrawn: () => judge(clean, { context: { signedOff: { [people.lead]: false } } }) },
  leaves: {
    'signed off': () => judge(clean, { context: { signedOff: { [people.lead]: true } } }),
    'not known': () => judge(clean, { context: { signedOff: {} } }),
    'a helper who gave no air': () =>
      judge(clean, { context: { signedOff: { [people.lead]: true, [people.helper]: false } } }),
  },
  params: { person: people.lead },
});

checkRule('working-alone', {
  finds: { 'one person, where two are asked for': () => judge(alone, strict) },
  leaves: {
    'one person, where that is allowed': () => judge(alone),
    'two people': () => judge(clean, strict),
    'one person without air': () =>
      judge(
        alone.filter((one) => one.type !== 'air-started'),
        strict,
      ),
  },
  params: { person: people.lead },
});
