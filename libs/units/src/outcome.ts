import type { Result } from './result';

/** The failing half of a result; it fits a result of any value. */
export type Failure = Extract<Result<never>, { ok: false }>;

/** A result that has its value. */
export const success = <T>(value: T): Result<T> => ({ ok: true, value });

/** A result that waits for inputs nobody has given yet. */
export const needs = (...fields: string[]): Failure => ({ ok: false, error: { kind: 'needs', fields } });

/** A result refused because one input cannot be; `range` says in words or figures what would be accepted. */
export const outOfRange = (field: string, range: string): Failure => ({
  ok: false,
  error: { kind: 'out-of-range', field, range },
});

/** Refuses a number that is not finite or lies outside `low..high` (both ends allowed). */
export function within(field: string, value: number, low: number, high: number): Failure | null {
  return value >= low && value <= high && Number.isFinite(value)
    ? null
    : outOfRange(field, `${low} to ${high}`);
}

/** Refuses a number that is not finite or not above `low`, or lies above `high`. */
export function above(field: string, value: number, low: number, high: number): Failure | null {
  return value > low && value <= high && Number.isFinite(value)
    ? null
    : outOfRange(field, `above ${low}, at most ${high}`);
}
