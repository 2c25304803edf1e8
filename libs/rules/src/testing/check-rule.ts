import { describe, expect, it } from 'vitest';
import type { Finding } from '../finding/finding';
import type { RuleId } from '../finding/rule-params';

interface Case {
  [when: string]: () => Finding[];
}

/**
 * A rule with the logs that it finds fault with, and those close by that it leaves alone. `params` are those of the first
 * finding of the first log.
 */
export function checkRule(ruleId: RuleId, cases: { finds: Case; leaves: Case; params: object }): void {
  describe(ruleId, () => {
    const of = (found: Finding[]) => found.filter((finding) => finding.ruleId === ruleId);
    it.each(Object.entries(cases.finds))('finds: %s', (_when, judged) => {
      expect(of(judged())).not.toEqual([]);
    });
    it.each(Object.entries(cases.leaves))('leaves: %s', (_when, judged) => {
      expect(of(judged())).toEqual([]);
    });
    it('gives the figures', () => {
      const [first] = Object.values(cases.finds).flatMap((judged) => of(judged()).slice(0, 1));
      expect(first?.params).toEqual(cases.params);
    });
  });
}
