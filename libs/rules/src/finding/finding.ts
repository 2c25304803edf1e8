import type { RuleId, RuleParams } from './rule-params';
import type { Severity } from './severity';

/** What one rule concludes: which, how bad, from which entries, with which figures. Plain data: it is stored and sent as it is. */
export interface FindingOf<T extends RuleId> {
  ruleId: T;
  severity: Severity;
  /** The entries it rests on, in the order of the log; empty when it rests on something missing. */
  entryIds: string[];
  params: RuleParams[T];
}

export type Finding = { [T in RuleId]: FindingOf<T> }[RuleId];

/** A finding as it comes back from a database: perhaps of a rule that this version does not know. */
export interface StoredFinding {
  ruleId: string;
  severity: Severity;
  entryIds: string[];
  params: Record<string, string | number>;
}
