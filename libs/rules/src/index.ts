export * from './finding/severity';
export * from './finding/finding';
export type { RuleId, RuleParams } from './finding/rule-params';
export type { Basis, Rule } from './finding/rule';
export { ceilingSources, plainCeiling, type CeilingSource, type ZoneCeiling } from './facts/ceilings';
export * from './input';
export { findings } from './findings';
export { rules, rulesById, RULES_VERSION } from './registry';
export * from './thresholds';
