import type { RuleId, RuleParams } from '../finding/rule-params';
import type { Say } from './say';

/** A sentence for every rule: what was found, and why it matters. A rule without one does not compile. */
export type RuleTexts = { readonly [T in RuleId]: (params: RuleParams[T], say: Say) => string };
