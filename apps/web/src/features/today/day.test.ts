import { expect, it } from 'vitest';
import { dayIn, dayShifted } from './day';

it('names the day of the company, not of Greenwich', () => {
  const lateEvening = Date.UTC(2026, 10, 3, 3, 30);
  expect(dayIn('America/Denver', lateEvening)).toBe('2026-11-02');
  expect(dayIn('UTC', lateEvening)).toBe('2026-11-03');
});

it('steps over month ends and the change of the clocks', () => {
  expect(dayShifted('2026-10-31', 1)).toBe('2026-11-01');
  expect(dayShifted('2026-11-01', 1)).toBe('2026-11-02');
  expect(dayShifted('2026-03-01', -1)).toBe('2026-02-28');
});
