import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { coldSeasonFirstDay, coldSeasonStartYear, dateInColdSeason, dayOfColdSeason } from './cold-season';
import { dateOfDay, dateOfDay365, dayNumber, dayOf365, isLocalDate } from './local-date';

describe('local dates', () => {
  it('counts days both ways', () => {
    fc.assert(
      fc.property(fc.integer({ min: -30000, max: 60000 }), (day) => {
        expect(dayNumber(dateOfDay(day))).toBe(day);
      }),
    );
    expect(dayNumber('1970-01-01')).toBe(0);
  });

  it('refuses days that are not in the calendar', () => {
    for (const text of ['2026-02-29', '2026-13-01', '2026-1-01', '2026-04-31', 'today', ''])
      expect(isLocalDate(text)).toBe(false);
    expect(isLocalDate('2028-02-29')).toBe(true);
  });

  it('turns days of a 365-day year into dates and back', () => {
    for (let day = 1; day <= 365; day++) {
      const date = dateOfDay365(2027, day);
      expect(dayOf365(Number(date.slice(5, 7)), Number(date.slice(8)))).toBe(day);
    }
    expect(dateOfDay365(2028, 281)).toBe('2028-10-08');
    expect(dayOf365(2, 29)).toBe(dayOf365(3, 1));
  });
});

describe('cold season', () => {
  it('runs from August 1 to July 31, so that January comes after December', () => {
    expect(coldSeasonFirstDay).toBe(213);
    expect(dayOfColdSeason(213)).toBe(0);
    expect(dayOfColdSeason(212)).toBe(364);
    expect(dayOfColdSeason(dayOf365(1, 5))).toBeGreaterThan(dayOfColdSeason(dayOf365(12, 30)));
    expect(dateInColdSeason(2026, dayOf365(12, 30))).toBe('2026-12-30');
    expect(dateInColdSeason(2026, dayOf365(1, 5))).toBe('2027-01-05');
  });

  it('is the one running until March and the coming one from April on', () => {
    expect(coldSeasonStartYear('2026-10-06')).toBe(2026);
    expect(coldSeasonStartYear('2027-03-31')).toBe(2026);
    expect(coldSeasonStartYear('2027-04-01')).toBe(2027);
  });
});
