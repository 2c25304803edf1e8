import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dateOfDay, dayNumber } from '../calendar/local-date';
import type { CapacityRequest, SeasonCrew, SeasonVisit } from './capacity-request';
import { seasonCapacity, type SeasonCapacity } from './season-capacity';

const today = '2026-10-01';
const dayAfter = (days: number): string => dateOfDay((dayNumber(today) ?? 0) + days);
const crew = (id: string, days: number, minutes = 480): SeasonCrew => ({
  id,
  days: Array.from({ length: days }, (_, day) => ({ date: dayAfter(day), minutes })),
});
const visit = (id: string, workMinutes: number | null, finishBy: string | null): SeasonVisit => ({
  id,
  workMinutes,
  finishBy,
});
const mildSite = (id: string, workMinutes: number): SeasonVisit => ({
  ...visit(id, workMinutes, null),
  noFreezeExpected: true,
});
const capacity = (request: Partial<CapacityRequest>): SeasonCapacity => {
  const result = seasonCapacity({ today, visits: [], crews: [], travelMinutesPerVisit: 20, ...request });
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};
const reasons = (result: SeasonCapacity): string[] =>
  result.left.map(({ visitId, reason }) => `${visitId} ${reason}`);

describe('seasonCapacity', () => {
  it('gives each visit a crew and a day, the earliest freeze first', () => {
    const result = capacity({
      crews: [crew('north', 2, 120)],
      visits: [
        visit('late', 40, dayAfter(5)),
        visit('soon', 40, dayAfter(0)),
        visit('sooner', 40, dayAfter(1)),
      ],
    });
    expect(result.placed).toEqual([
      { visitId: 'soon', crewId: 'north', date: dayAfter(0) },
      { visitId: 'sooner', crewId: 'north', date: dayAfter(0) },
      { visitId: 'late', crewId: 'north', date: dayAfter(1) },
    ]);
    expect(result).toMatchObject({ fits: true, left: [], minutesShort: 0, crewDaysShort: 0 });
    expect([result.minutesNeeded, result.minutesAvailable]).toEqual([180, 240]);
  });

  it('says which date is short, by how much, and how many crew days would be needed at least', () => {
    const visits = Array.from({ length: 20 }, (_, at) => visit(`v${at}`, 40, dayAfter(1)));
    const result = capacity({ crews: [crew('north', 10)], visits });
    expect(result.byDate).toEqual([
      { date: dayAfter(1), visitsDue: 20, minutesDue: 1200, minutesAvailable: 960, minutesToSpare: -240 },
    ]);
    expect([result.minutesShort, result.crewDaysShort, result.left.length]).toEqual([240, 1, 4]);
    expect(new Set(result.left.map(({ reason }) => reason))).toEqual(new Set(['no-hours-left']));
  });

  it('tells why a visit has no day', () => {
    const result = capacity({
      crews: [crew('north', 3, 100), { id: 'idle', days: [] }],
      visits: [
        visit('unknown work', null, dayAfter(2)),
        visit('unknown date', 30, null),
        visit('passed', 30, dayAfter(-1)),
        { ...visit('not ready', 30, dayAfter(1)), earliestDate: dayAfter(2) },
        { ...visit('no crew', 30, dayAfter(2)), crewIds: ['idle'] },
        visit('long', 200, dayAfter(2)),
        mildSite('mild site', 30),
      ],
    });
    expect(reasons(result).sort()).toEqual([
      'long longer-than-any-day',
      'no crew no-crew-in-time',
      'not ready not-ready-before-freeze',
      'passed freeze-date-passed',
      'unknown date needs-finish-by',
      'unknown work needs-work-minutes',
    ]);
    expect(result.placed.map(({ visitId }) => visitId)).toEqual(['mild site']);
    expect(result.explanation.missing).toEqual([
      'visit unknown work: workMinutes',
      'visit unknown date: finishBy',
    ]);
  });

  it('does not call a visit that just fills a day longer than any day', () => {
    const visits = [visit('first', 80, dayAfter(0)), visit('second', 80, dayAfter(0))];
    expect(reasons(capacity({ crews: [crew('north', 1, 100)], visits }))).toEqual(['second no-hours-left']);
  });

  it('says that 20 minutes of driving a visit are assumed (common practice, no source)', () => {
    const result = seasonCapacity({ today, visits: [mildSite('a', 40)], crews: [crew('north', 1)] });
    if (!result.ok) throw new Error(JSON.stringify(result.error));
    expect(result.value.minutesNeeded).toBe(60);
    expect(result.value.explanation.assumed).toMatchObject([{ field: 'travelMinutesPerVisit', value: 20 }]);
  });

  it('has no number of crew days to give when no crew works at all', () => {
    const result = capacity({ visits: [visit('a', 40, dayAfter(3))] });
    expect(result).toMatchObject({ fits: false, minutesShort: 60, crewDaysShort: null });
  });

  it('keeps every date, every day and every crew; leaves out no visit; never fits what cannot fit', () => {
    const offset = fc.integer({ min: 0, max: 8 });
    const anyVisits = fc.array(
      fc.record({
        work: fc.integer({ min: 10, max: 200 }),
        due: offset,
        from: offset,
        only: fc.constantFrom('a', 'b', ''),
      }),
      { maxLength: 60 },
    );
    const anyDays = fc.array(fc.integer({ min: 0, max: 300 }), { maxLength: 9 });
    fc.assert(
      fc.property(anyVisits, anyDays, anyDays, (all, a, b) => {
        const visits = all.map(({ work, due, from, only }, at) => ({
          ...visit(`v${at}`, work, dayAfter(due)),
          earliestDate: dayAfter(from),
          ...(only ? { crewIds: [only] } : {}),
        }));
        const crews = [a, b].map((days, at) => ({
          id: at === 0 ? 'a' : 'b',
          days: days.map((minutes, day) => ({ date: dayAfter(day), minutes })),
        }));
        const result = capacity({ visits, crews });
        expect([...result.placed, ...result.left].map(({ visitId }) => visitId).sort()).toEqual(
          visits.map(({ id }) => id).sort(),
        );
        const used = new Map<string, number>();
        for (const { visitId, crewId, date } of result.placed) {
          const done = visits.find(({ id }) => id === visitId);
          expect(date <= (done?.finishBy ?? '') && date >= (done?.earliestDate ?? '9')).toBe(true);
          expect(done?.crewIds ?? [crewId]).toContain(crewId);
          used.set(crewId + date, (used.get(crewId + date) ?? 0) + (done?.workMinutes ?? 0) + 20);
        }
        for (const { id, days } of crews)
          for (const { date, minutes } of days) expect(used.get(id + date) ?? 0).toBeLessThanOrEqual(minutes);
        if (result.minutesShort > 0) expect(result.fits).toBe(false);
        if (visits.length > 0 && crews.every(({ days }) => days.length === 0))
          expect(result.fits).toBe(false);
      }),
      { numRuns: 150 },
    );
  });

  it('never does worse with one more crew', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 8 }), { maxLength: 60 }), (dues) => {
        const visits = dues.map((due, at) => visit(`v${at}`, 40, dayAfter(due)));
        const one = capacity({ visits, crews: [crew('a', 9, 180)] });
        const two = capacity({ visits, crews: [crew('a', 9, 180), crew('b', 9, 180)] });
        expect(two.left.length).toBeLessThanOrEqual(one.left.length);
        expect(two.minutesShort).toBeLessThanOrEqual(one.minutesShort);
      }),
    );
  });

  it('refuses impossible input and names it', () => {
    const ask = (request: Partial<CapacityRequest>): unknown =>
      seasonCapacity({ today, visits: [], crews: [], ...request });
    expect(ask({ today: '2026-10-32' })).toMatchObject({ error: { field: 'today' } });
    expect(ask({ visits: [mildSite('a', -1)] })).toMatchObject({
      error: { field: 'visit a: workMinutes' },
    });
    expect(ask({ visits: [visit('a', 30, 'soon')] })).toMatchObject({
      error: { field: 'visit a: finishBy' },
    });
    expect(ask({ visits: [mildSite('a', 30), mildSite('a', 30)] })).toMatchObject({
      error: { field: 'visits' },
    });
    expect(ask({ crews: [{ id: 'a', days: [{ date: today, minutes: 1500 }] }] })).toMatchObject({
      error: { field: `crew a: minutes on ${today}` },
    });
    expect(
      ask({
        crews: [
          {
            id: 'a',
            days: [
              { date: today, minutes: 1 },
              { date: today, minutes: 1 },
            ],
          },
        ],
      }),
    ).toMatchObject({
      error: { field: 'crew a: days' },
    });
  });
});
