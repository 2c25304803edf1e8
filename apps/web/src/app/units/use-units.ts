import type { CompanySettings } from '@rimeward/contracts';
import { createContext, useContext, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { unitsOf, type Units } from './units';

export const UnitSettingsContext = createContext<Pick<CompanySettings, 'units' | 'metricPressure'>>({
  units: 'us',
  metricPressure: 'kPa',
});

/** Figures in the company's units and the reader's number signs. */
export function useUnits(): Units {
  const settings = useContext(UnitSettingsContext);
  const { i18n } = useTranslation();
  const locale = i18n.language.startsWith('es') ? 'es-US' : 'en-US';
  return useMemo(() => unitsOf(settings, locale), [settings, locale]);
}
