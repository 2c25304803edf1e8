import { formulas, type FormulaId } from './formulas';
import type { SourceId } from './sources';

/** A plain value that went into a computation, as a screen can print it. */
export type InputValue = string | number | boolean | null;

/** Why a value nobody gave was put in its place. A screen translates it. */
export type AssumptionReason =
  | 'nominal-inside-diameter'
  | 'default-policy'
  | 'rated-for-cold-air'
  | 'smooth-hose'
  | 'coupling-factor'
  | 'hose-wall'
  | 'heat-transfer'
  | 'aftercooler-approach'
  | 'oil-flooded-screw'
  | 'dry-compression'
  | 'discharge-at-rated-pressure'
  | 'whole-main-in-series'
  | 'full-flow-to-the-end'
  | 'heads-pass-design-flow'
  | 'level-ground'
  | 'air-at-standard-temperature'
  | 'time-factor'
  | 'middle-of-the-range'
  | 'cooled-to-rating-temperature'
  | 'galvanized-as-policy';

/** An input nobody gave, the value used in its place, and why that value. */
export interface Assumption {
  field: string;
  value: InputValue;
  why: AssumptionReason;
}

/** What stands behind a figure. Plain data: it can be stored, sent and shown. */
export interface Explanation {
  inputs: Readonly<Record<string, InputValue>>;
  assumed: readonly Assumption[];
  /** Inputs that were not there; what depends on them was left out. */
  missing: readonly string[];
  formulaId: FormulaId;
  sourceIds: readonly SourceId[];
}

/** A computed figure with what stands behind it. */
export interface Explained {
  why: Explanation;
}

const none: readonly never[] = [];

/** Builds an explanation; the sources are those of the formula. */
export const explain = (
  formulaId: FormulaId,
  inputs: Readonly<Record<string, InputValue>>,
  assumed: readonly Assumption[] = none,
  missing: readonly string[] = none,
): Explanation => ({ inputs, assumed, missing, formulaId, sourceIds: formulas[formulaId].sourceIds });
