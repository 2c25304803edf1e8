import { createContext, useContext, useMemo, useState, type ReactNode } from 'react';
import { displayModes, type DisplayMode } from './modes';

export interface Preferences {
  mode: DisplayMode;
  /** Keys of the desk screens (next, previous, accept ...) can be switched off. */
  keys: boolean;
}

const storageKey = 'rimeward.preferences';
const defaults: Preferences = { mode: 'paper', keys: true };

function read(): Preferences {
  try {
    const kept = JSON.parse(localStorage.getItem(storageKey) ?? '{}') as Partial<Preferences>;
    const mode = displayModes.find((one) => one === kept.mode) ?? defaults.mode;
    return { mode, keys: kept.keys !== false };
  } catch (error) {
    console.info('Preferences cannot be read; the defaults hold', error);
    return defaults;
  }
}

const PreferencesContext = createContext<[Preferences, (change: Partial<Preferences>) => void]>([
  defaults,
  () => {},
]);

/** Display mode and keys of this browser, not of the person: they follow the light and the desk. */
export function PreferencesProvider({ children }: { children: ReactNode }) {
  const [preferences, setPreferences] = useState(read);
  const value = useMemo((): [Preferences, (change: Partial<Preferences>) => void] => {
    const change = (part: Partial<Preferences>): void => {
      const next = { ...preferences, ...part };
      setPreferences(next);
      localStorage.setItem(storageKey, JSON.stringify(next));
    };
    return [preferences, change];
  }, [preferences]);
  return <PreferencesContext.Provider value={value}>{children}</PreferencesContext.Provider>;
}

export function usePreferences(): [Preferences, (change: Partial<Preferences>) => void] {
  return useContext(PreferencesContext);
}
