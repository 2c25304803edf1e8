import { useSyncExternalStore } from 'react';

/** Reasons why the application must not be reloaded just now: an open draft, the camera, air on. */
const reasons = new Set<symbol>();
const listeners = new Set<() => void>();

/** Holds updates back until the returned function is called. */
export function holdUpdates(): () => void {
  const reason = Symbol('busy');
  reasons.add(reason);
  tell();
  return () => {
    reasons.delete(reason);
    tell();
  };
}

function tell(): void {
  for (const listener of listeners) listener();
}

export function useQuietMoment(): boolean {
  return useSyncExternalStore(
    (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    () => reasons.size === 0,
  );
}
