import { v7 as uuidv7 } from 'uuid';
import { database } from './database/database';
import type { Intent } from './database/schema';
import { activeEnrolment } from './device/enrolment';

/** Remembers for which field the camera is opened: the page may be killed before the picture comes back. */
export async function openIntent(intent: {
  visit: string;
  field: string;
  detail?: unknown;
}): Promise<string> {
  const id = uuidv7();
  const owner = (await activeEnrolment())?.owner ?? '';
  const { visit, field, detail = null } = intent;
  await database().intents.put({ id, owner, visit, field, detail, openedMs: Date.now() });
  return id;
}

/** The active person's open intents, oldest first. */
export async function pendingIntents(): Promise<Intent[]> {
  const owner = (await activeEnrolment())?.owner;
  return owner === undefined ? [] : database().intents.where({ owner }).sortBy('openedMs');
}

/** The picture has come back, or was given up. */
export async function closeIntent(id: string): Promise<void> {
  await database().intents.delete(id);
}
