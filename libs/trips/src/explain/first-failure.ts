import type { Failure } from '@rimeward/units';

/** The first failure among checks that give a failure or nothing. */
export function firstFailure(...checks: (Failure | null | undefined)[]): Failure | undefined {
  return checks.find((check) => check !== null && check !== undefined) ?? undefined;
}
