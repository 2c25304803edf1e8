import { database } from '../database/database';
import { originalBytes } from './chunks';

/** A photograph for the screen, from this phone only; a preview falls back to the original. Null when it is not here. */
export async function readPhoto(
  sha256: string,
  which: 'preview' | 'original' = 'preview',
): Promise<Blob | null> {
  const db = database();
  if (which === 'preview') {
    const preview = await db.previews.get(sha256);
    if (preview !== undefined) return new Blob([preview.bytes], { type: preview.type });
  }
  const photo = await db.photos.where({ sha256 }).first();
  if (photo === undefined) return null;
  const bytes = await originalBytes(db, sha256, photo.bytes);
  return bytes === null ? null : new Blob([bytes], { type: photo.type });
}
