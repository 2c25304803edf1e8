import { factsOf } from './facts/facts';
import type { Finding } from './finding/finding';
import { severities, type Severity } from './finding/severity';
import type { RulesInput } from './input';
import { rules } from './registry';

const rank: Readonly<Record<Severity, number>> = Object.fromEntries(
  severities.map((severity, index) => [severity, index]),
) as Record<Severity, number>;

/**
 * What the rules conclude from one visit, worst first; within a severity in the order of the work. A pure function of its input,
 * the same on phone and server; never throws for any fold. A visit done right gives none.
 */
export function findings(input: RulesInput): Finding[] {
  const facts = factsOf(input);
  const found: Finding[] = [];
  for (const rule of rules) {
    rule.find(facts, (entryIds, params, severity = rule.severity) => {
      const ids = entryIds.filter((id) => id !== undefined);
      // Each rule reports its own params, which its type has checked.
      found.push({ ruleId: rule.id, severity, entryIds: ids, params } as Finding);
    });
  }
  // Stable: findings of one severity stay in the order of the rules.
  return found.sort((one, other) => rank[one.severity] - rank[other.severity]);
}
