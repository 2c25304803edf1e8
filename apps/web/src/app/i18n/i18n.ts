import { createInstance } from 'i18next';
import { initReactI18next } from 'react-i18next';
import shellEn from '../texts.en';
import shellEs from '../texts.es';

export const languages = ['en', 'es'] as const;
export type Language = (typeof languages)[number];

const storageKey = 'rimeward.language';

function firstLanguage(): Language {
  const kept = localStorage.getItem(storageKey) ?? navigator.language;
  return kept.startsWith('es') ? 'es' : 'en';
}

/** English and Spanish, both complete; the texts of a feature are added by its route. */
export const i18n = createInstance();

void i18n.use(initReactI18next).init({
  lng: firstLanguage(),
  fallbackLng: 'en',
  defaultNS: 'shell',
  initAsync: false,
  interpolation: { escapeValue: false },
  resources: { en: { shell: shellEn }, es: { shell: shellEs } },
});
document.documentElement.lang = i18n.language;

/** Adds a feature's texts in both languages, once, before its screens are shown. */
export function addTexts(namespace: string, texts: Record<Language, object>): void {
  for (const language of languages) i18n.addResourceBundle(language, namespace, texts[language]);
}

export async function chooseLanguage(language: Language): Promise<void> {
  localStorage.setItem(storageKey, language);
  document.documentElement.lang = language;
  await i18n.changeLanguage(language);
}

/** The language of the person who signs in, unless this browser has been told another. */
export async function offerLanguage(language: Language): Promise<void> {
  if (localStorage.getItem(storageKey) === null) await chooseLanguage(language);
}
