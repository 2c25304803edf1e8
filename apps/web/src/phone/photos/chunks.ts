import { Dexie } from 'dexie';
import type { PhoneDatabase } from '../database/database';
import { photoLimits } from './limits';

/**
 * Size of a stored chunk, bytes: the same as one part of an upload. Chunks are ArrayBuffers, never Blobs: one engine
 * loses Blobs in IndexedDB at times.
 */
export const chunkBytes = photoLimits.partBytes;

/** Writes the bytes in chunks and reads each one back; false when what came back is not what was written. */
export async function storeChunks(db: PhoneDatabase, sha256: string, bytes: ArrayBuffer): Promise<boolean> {
  for (let n = 0; n * chunkBytes < bytes.byteLength; n += 1) {
    const chunk = bytes.slice(n * chunkBytes, (n + 1) * chunkBytes);
    await db.chunks.put({ sha256, n, bytes: chunk });
    const back = await db.chunks.get([sha256, n]);
    if (back === undefined || !equal(new Uint8Array(back.bytes), new Uint8Array(chunk))) return false;
  }
  return true;
}

/** All bytes of a stored photograph; null when a chunk is missing or the length is another. */
export async function originalBytes(
  db: PhoneDatabase,
  sha256: string,
  length: number,
): Promise<ArrayBuffer | null> {
  const rows = await db.chunks
    .where('[sha256+n]')
    .between([sha256, Dexie.minKey], [sha256, Dexie.maxKey])
    .toArray();
  const whole = new Uint8Array(length);
  let at = 0;
  for (const { n, bytes } of rows) {
    if (n * chunkBytes !== at || at + bytes.byteLength > length) return null;
    whole.set(new Uint8Array(bytes), at);
    at += bytes.byteLength;
  }
  return at === length ? whole.buffer : null;
}

function equal(a: Uint8Array, b: Uint8Array): boolean {
  return a.length === b.length && a.every((byte, index) => byte === b[index]);
}
