import { closeDatabase, database } from './database';
import { databaseFault, type DatabaseFault } from './faults';

/** How long an older tab may hold an upgrade up before that is said, ms. */
const openLimitMs = 10_000;

/**
 * Opens the database, and once more after a failure. Nothing is ever deleted because of an error: what cannot be opened
 * is left as it is for the rescue page.
 */
export async function openPhone(): Promise<{ ok: true } | { ok: false; fault: DatabaseFault }> {
  const first = await tryOpen();
  if (first === null) return { ok: true };
  closeDatabase();
  const second = await tryOpen();
  return second === null ? { ok: true } : { ok: false, fault: second };
}

async function tryOpen(): Promise<DatabaseFault | null> {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const late = new Promise<DatabaseFault>((resolve) => {
    timer = setTimeout(() => resolve('database-blocked'), openLimitMs);
  });
  try {
    return await Promise.race([
      database()
        .open()
        .then(() => null),
      late,
    ]);
  } catch (error) {
    return databaseFault(error) ?? 'database-broken';
  } finally {
    clearTimeout(timer);
  }
}
