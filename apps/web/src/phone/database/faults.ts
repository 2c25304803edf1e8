import { Dexie } from 'dexie';

/** What can be wrong with the phone's database as such. */
export type DatabaseFault = 'storage-full' | 'database-broken' | 'database-blocked';

const full = ['QuotaExceededError'];
const blocked = ['VersionError', 'BlockedError'];

/**
 * Names the fault of an error that came out of the database; null when the error is not the database's: then it is a
 * mistake in the program and must go on upwards.
 */
export function databaseFault(error: unknown): DatabaseFault | null {
  const names = namesOf(error);
  if (names.some((name) => full.includes(name))) return 'storage-full';
  if (names.some((name) => blocked.includes(name))) return 'database-blocked';
  if (error instanceof Dexie.DexieError || error instanceof DOMException) return 'database-broken';
  return null;
}

function namesOf(error: unknown, depth = 0): string[] {
  if (typeof error !== 'object' || error === null || depth > 4) return [];
  const { name, inner, cause } = error as { name?: unknown; inner?: unknown; cause?: unknown };
  return [
    ...(typeof name === 'string' ? [name] : []),
    ...namesOf(inner, depth + 1),
    ...namesOf(cause, depth + 1),
  ];
}
