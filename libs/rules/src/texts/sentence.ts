import type { StoredFinding } from '../finding/finding';
import { en } from './en';
import { es } from './es';
import { sayIn, type Reader, type Say } from './say';
import type { RuleTexts } from './rule-texts';
import { wordsEn } from './words.en';
import { wordsEs } from './words.es';

export type RulesLanguage = 'en' | 'es';

const texts: Readonly<Record<RulesLanguage, RuleTexts>> = { en, es };
const words = { en: wordsEn, es: wordsEs };
const unknownRule: Readonly<Record<RulesLanguage, (ruleId: string) => string>> = {
  en: (ruleId) => `A finding of another version of the rules: ${ruleId}.`,
  es: (ruleId) => `Un hallazgo de otra versión de las reglas: ${ruleId}.`,
};
const usReader: Reader = { units: 'us', metricPressure: 'kPa' };

/**
 * What a finding says, in one sentence or two: what and why, in the reader's language and units. Takes stored findings too; one of a
 * rule that this version does not know is named by its id.
 */
export function sentence(finding: StoredFinding, language: RulesLanguage, reader: Reader = usReader): string {
  const { ruleId, params } = finding;
  if (!Object.hasOwn(en, ruleId)) return unknownRule[language](ruleId);
  // The params were made by the rule of this id; its text takes what that rule gives.
  const text = texts[language][ruleId as keyof RuleTexts] as (params: unknown, say: Say) => string;
  return text(params, sayIn(words[language], reader));
}
