import type { PhoneDatabase } from '../database/database';

/** Every photograph that a draft or an intent names: any 64 hexadecimal digits in them count. */
export async function namedPhotos(db: PhoneDatabase): Promise<Set<string>> {
  const [drafts, intents] = await Promise.all([db.drafts.toArray(), db.intents.toArray()]);
  const text = JSON.stringify([drafts.map(({ value }) => value), intents.map(({ detail }) => detail)]);
  return new Set(text.match(/\b[0-9a-f]{64}\b/g) ?? []);
}
