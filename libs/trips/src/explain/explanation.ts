import type { SourceId } from './sources';

/** A plain value that went into a computation, as a screen can print it. */
export type InputValue = string | number | boolean | null;

/** An input nobody gave, the value used in its place, and why that value. */
export interface Assumption {
  field: string;
  value: InputValue;
  why: string;
}

/**
 * What stands behind a computed figure. Plain objects only, so that it can be stored and shown:
 * the inputs used, what was assumed in place of an input, what was missing (and therefore left out),
 * the formula and the sources.
 */
export interface Explanation {
  inputs: Record<string, InputValue>;
  assumed: Assumption[];
  missing: string[];
  formulaId: string;
  sourceIds: SourceId[];
}
