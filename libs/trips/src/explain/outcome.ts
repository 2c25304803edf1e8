import type { Result } from '@rimeward/units';

/** The failing half of a result, fit to be returned as a result of any value. */
export type Failure = Extract<Result<never>, { ok: false }>;

/** A result that has its value. */
export const success = <T>(value: T): Result<T> => ({ ok: true, value });

/** A result that waits for inputs. */
export const needs = (...fields: string[]): Failure => ({ ok: false, error: { kind: 'needs', fields } });

/** A result refused because one input cannot be. */
export const outOfRange = (field: string, range: string): Failure => ({
  ok: false,
  error: { kind: 'out-of-range', field, range },
});

/** The first failure among checks that give a failure or nothing. */
export function firstFailure(...checks: (Failure | undefined)[]): Failure | undefined {
  return checks.find((check) => check !== undefined);
}

/** Refuses a number that is not finite or lies outside `low..high` (both ends allowed). */
export function within(field: string, value: number, low: number, high: number): Failure | undefined {
  return Number.isFinite(value) && value >= low && value <= high
    ? undefined
    : outOfRange(field, `${low} to ${high}`);
}
