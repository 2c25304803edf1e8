import type { LogEntry } from '@rimeward/field-log';
import { database } from '../database/database';
import { databaseFault, type DatabaseFault } from '../database/faults';
import { openPhone } from '../database/open-phone';
import { wakeDelivery } from '../delivery/wake';
import { afterSave } from './after-save';
import { dropBallast } from './ballast';
import type { NewEntry } from './entry-draft';
import { writeEntry } from './entry-transaction';
import { SaveRefused, type Refusal } from './save-refused';
import { tellLiveQueries } from './tell-live-queries';

export type { NewEntry } from './entry-draft';

export type SaveFault = Refusal | DatabaseFault;

export type SaveResult = { ok: true; entry: LogEntry } | { ok: false; fault: SaveFault };

/**
 * Writes one entry at the end of this device's chain. `ok` means that the browser has committed it with strict
 * durability; only then may a screen say "saved on this phone". A full phone gives up its ballast, a lost connection is
 * opened once again, before either is reported.
 */
export async function saveEntry(entry: NewEntry): Promise<SaveResult> {
  let result = await attempt(entry);
  if (!result.ok && result.fault === 'storage-full' && (await freeRoom())) result = await attempt(entry);
  if (!result.ok && result.fault === 'database-broken' && (await openPhone()).ok)
    result = await attempt(entry);
  return result;
}

/** What follows a save and must not delay it. */
function afterwards(): void {
  setTimeout(() => {
    wakeDelivery();
    afterSave();
  }, 0);
}

async function attempt(entry: NewEntry): Promise<SaveResult> {
  try {
    const db = database();
    if (!db.isOpen()) await db.open();
    const written = await writeEntry(db.backendDB(), entry, Date.now());
    tellLiveQueries(db, written);
    afterwards();
    return { ok: true, entry: written.row.entry };
  } catch (error) {
    if (error instanceof SaveRefused) return { ok: false, fault: error.fault };
    const fault = databaseFault(error);
    if (fault === null) throw error;
    return { ok: false, fault };
  }
}

async function freeRoom(): Promise<boolean> {
  try {
    return await dropBallast();
  } catch (error) {
    if (databaseFault(error) === null) throw error;
    return false;
  }
}
