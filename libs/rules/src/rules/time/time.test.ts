import { describe, expect, it } from 'vitest';
import type { LogEntry } from '@rimeward/field-log';
import { entry, testId } from '@rimeward/field-log/testing';
import { people, written } from '@rimeward/field-log/testing/clean-visit';
import { before, changed, clean, judge, judgeLog } from '../../testing/judge';
import { line } from '@rimeward/field-log/testing/clean-visit';
import { checkRule } from '../../testing/check-rule';

const device = testId(1);
const log = written(clean);
const minute = 60_000;
const from = (index: number, shift: (one: LogEntry) => Partial<LogEntry['time']>): LogEntry[] =>
  log.map((one, at) => (at < index ? one : { ...one, time: { ...one.time, ...shift(one) } }));
const wallShifted = (minutes: number) => (one: LogEntry) => ({
  wall: new Date(Date.parse(one.time.wall) + minutes * minute).toISOString(),
});

checkRule('clock-set-back', {
  finds: { 'three hours, between two entries': () => judgeLog(from(10, wallShifted(-180))) },
  leaves: {
    'two minutes, as clocks do': () => judgeLog(from(10, wallShifted(-2))),
    'set back, and the office knows by how much': () =>
      judgeLog(from(10, (one) => ({ ...wallShifted(-180)(one), offsetMs: 180 * minute }))),
    'a second phone that is three hours behind': () =>
      judgeLog([
        ...log,
        ...written([line('note-written', { text: 'helper' })], { device: testId(2), firstMinute: -180 }),
      ]),
  },
  params: { device, minutes: 179, times: 1 },
});

checkRule('clock-changed', {
  finds: {
    'an hour, known from the office': () =>
      judgeLog(from(10, (one) => ({ ...wallShifted(60)(one), offsetMs: -60 * minute }))),
  },
  leaves: {
    'an offset known for the first time': () => {
      const unknown = log.map((one) => ({ ...one, time: { ...one.time, offsetMs: null } }));
      return judgeLog(
        unknown.map((one, at) => (at < 10 ? one : { ...one, time: { ...one.time, offsetMs: 9e6 } })),
      );
    },
  },
  params: { device, minutes: 60 },
});

checkRule('clock-implausible', {
  finds: { 'in 1970': () => judgeLog(from(0, () => ({ wall: '1970-01-01T00:00:00.000Z' }))) },
  leaves: { today: () => judge(clean) },
  params: { device, entries: clean.length },
});

const stay = (fromMinute: number, toMinute: number, actor: string = people.lead) => {
  const start = Date.UTC(2026, 9, 20, 14, 0);
  const [fromMs, toMs] = [start + fromMinute * minute, start + toMinute * minute];
  return { context: { otherStays: [{ visitId: testId(501), siteName: 'Mill Park', actor, fromMs, toMs }] } };
};
checkRule('two-places-at-once', {
  finds: { 'half an hour elsewhere in between': () => judge(clean, stay(5, 35)) },
  leaves: {
    'ten minutes of overlap, the border itself': () => judge(clean, stay(-60, 11)),
    'elsewhere before': () => judge(clean, stay(-60, 5)),
    'somebody else': () => judge(clean, stay(5, 35, testId(902))),
    'an answer written later from elsewhere': () => {
      const answer = line('question-answered', { questionId: testId(81), answer: 'yes' }, { wait: 600 });
      return judge([...clean, answer], stay(300, 400));
    },
  },
  params: { person: people.lead, elsewhere: 'Mill Park', minutes: 30 },
});

checkRule('visit-shorter-than-air', {
  finds: { 'an hour of air in a short visit': () => judge(changed('air-stopped', { elapsedMs: 3_600_000 })) },
  leaves: {
    'as long as it took': () => judge(clean),
    'a minute more than there was, by late thumbs': () =>
      judge(changed('air-stopped', { elapsedMs: (minutesOfVisit() + 1) * 15_000 })),
    'not left yet': () => judge(changed('air-stopped', { elapsedMs: 3_600_000 }).slice(0, -1)),
  },
  params: { visitSeconds: minutesOfVisit() * 60, airSeconds: 4 * 3_600 },
});

function minutesOfVisit(): number {
  return clean.slice(1).reduce((sum, one) => sum + one.wait, 0);
}

const gap = (of: string) => ({ context: { deviceGaps: [{ device: of, fromSeq: 3, toSeq: 4 }] } });
checkRule('device-gap', {
  finds: { 'two entries missing': () => judge(clean, gap(device)) },
  leaves: { 'missing of a phone that was not here': () => judge(clean, gap(testId(9))) },
  params: { device, missing: 2 },
});

const [second] = [entry('note-written', { text: 'x' }, { seq: 2 })];
checkRule('chain-broken', {
  finds: {
    'one entry does not continue': () =>
      judge(clean, { context: { brokenChains: [{ device, seq: 2, entryId: second.id }] } }),
  },
  leaves: { 'an unbroken chain': () => judge(before('left', []), { context: { brokenChains: [] } }) },
  params: { device, seq: 2 },
});

describe('a gap of a phone', () => {
  it('rests on the first entry of that phone after it', () => {
    const helper = written([line('note-written', { text: 'helper' })], {
      device: testId(2),
      firstMinute: 90,
    });
    const found = judgeLog([...log, ...helper], gap(device)).find((one) => one.ruleId === 'device-gap');
    expect(found?.entryIds).toEqual([log.find((one) => one.seq === 5)?.id]);
  });
});
