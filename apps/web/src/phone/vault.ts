import { database, type PhoneDatabase } from './database/database';
import type { Owner, Sealed } from './database/schema';

/**
 * Key for gate codes and access notes, one per person and company, made on first use. It cannot be exported: a copy of
 * the database's files alone does not open them.
 */
export async function vaultKey(owner: Owner, db: PhoneDatabase = database()): Promise<CryptoKey> {
  const stored = await db.keys.get(owner);
  if (stored !== undefined) return stored.key;
  const key = await crypto.subtle.generateKey({ name: 'AES-GCM', length: 256 }, false, [
    'encrypt',
    'decrypt',
  ]);
  return db.transaction('rw', db.keys, async () => {
    // Another tab may have made one meanwhile: the first one stands.
    const first = await db.keys.get(owner);
    if (first !== undefined) return first.key;
    await db.keys.add({ owner, key });
    return key;
  });
}

export async function sealText(key: CryptoKey, text: string): Promise<Sealed> {
  const iv = crypto.getRandomValues(new Uint8Array(12));
  const cipher = await crypto.subtle.encrypt({ name: 'AES-GCM', iv }, key, new TextEncoder().encode(text));
  return { iv, cipher };
}

/** The text; null when this key does not open it. */
export async function openText(key: CryptoKey, sealed: Sealed): Promise<string | null> {
  try {
    const plain = await crypto.subtle.decrypt({ name: 'AES-GCM', iv: sealed.iv }, key, sealed.cipher);
    return new TextDecoder().decode(plain);
  } catch (error) {
    if (error instanceof DOMException) return null;
    throw error;
  }
}
