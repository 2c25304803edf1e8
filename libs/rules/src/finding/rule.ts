import type { VisitFacts } from '../facts/facts';
import type { RuleId, RuleParams } from './rule-params';
import type { Severity } from './severity';

/**
 * What a rule stands on. `published`: a source that can be read, named with its place; `common-practice`: what the trade does,
 * without a source; `own-record`: it follows from the log itself.
 */
export type Basis =
  { kind: 'published'; source: string } | { kind: 'common-practice' } | { kind: 'own-record' };

/** Called once for each conclusion; without a severity the rule's own holds. Ids that are missing are left out. */
export type Report<T extends RuleId> = (
  entryIds: readonly (string | undefined)[],
  params: RuleParams[T],
  severity?: Severity,
) => void;

export interface Rule<T extends RuleId> {
  /** Stable for ever: stored findings, decisions and texts name it. */
  id: T;
  severity: Severity;
  basis: Basis;
  find: (facts: VisitFacts, report: Report<T>) => void;
}

export const commonPractice: Basis = { kind: 'common-practice' };
export const ownRecord: Basis = { kind: 'own-record' };
export const published = (source: string): Basis => ({ kind: 'published', source });
