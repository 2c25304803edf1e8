import { database } from './database/database';
import { activeEnrolment } from './device/enrolment';

/** What the active person has typed and not yet saved as an entry under this key; null when there is nothing. */
export async function readDraft<T>(key: string): Promise<T | null> {
  const owner = await draftOwner();
  const row = owner === null ? undefined : await database().drafts.get([owner, key]);
  return row === undefined ? null : (row.value as T);
}

/** Keeps it; call it on every change. Values must be structured-cloneable. */
export async function writeDraft(key: string, value: unknown): Promise<void> {
  const owner = await draftOwner();
  if (owner === null) return;
  await database().drafts.put({ owner, key, value, changedMs: Date.now() });
}

/** Once it has become an entry, or was thrown away by hand. */
export async function dropDraft(key: string): Promise<void> {
  const owner = await draftOwner();
  if (owner !== null) await database().drafts.delete([owner, key]);
}

/** Keys of the active person's drafts that begin with `prefix`. */
export async function openDraftKeys(prefix = ''): Promise<string[]> {
  const owner = await draftOwner();
  if (owner === null) return [];
  const range = database()
    .drafts.where('[owner+key]')
    .between([owner, prefix], [owner, prefix + '\uffff'], true, true);
  return (await range.primaryKeys()).map(([, key]) => key);
}

async function draftOwner(): Promise<string | null> {
  return (await activeEnrolment())?.owner ?? null;
}
