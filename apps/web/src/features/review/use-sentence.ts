import { sentence, type StoredFinding } from '@rimeward/rules';
import { useContext } from 'react';
import { useTranslation } from 'react-i18next';
import { UnitSettingsContext } from '../../app/units/use-units';

/** What a finding says in the reader's language and the company's units. */
export function useSentence(): (finding: StoredFinding) => string {
  const { i18n } = useTranslation();
  const reader = useContext(UnitSettingsContext);
  const language = i18n.language.startsWith('es') ? 'es' : 'en';
  return (finding) => sentence(finding, language, reader);
}
