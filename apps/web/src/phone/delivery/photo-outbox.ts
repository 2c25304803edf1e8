import { toHex, type DeliveryStore } from '@rimeward/delivery';
import type { PhoneDatabase } from '../database/database';
import { originalBytes } from '../photos/chunks';

type PhotoCalls = Pick<
  DeliveryStore,
  'pendingPhotos' | 'readPreview' | 'readPart' | 'photoIsWhole' | 'settlePhoto' | 'reopenPhotos'
>;

/** The photographs' side of the delivery store. */
export function photoOutbox(db: PhoneDatabase, device: string): PhotoCalls {
  return {
    pendingPhotos: async (limit) => {
      const rows = await db.photos.where({ device, state: 'pending' }).limit(limit).toArray();
      rows.sort((a, b) => a.storedMs - b.storedMs);
      return rows.map(({ sha256, bytes, type }) => ({ sha256, bytes, type }));
    },
    readPreview: async (sha256) => {
      const preview = await db.previews.get(sha256);
      return preview === undefined ? null : new Uint8Array(preview.bytes);
    },
    readPart: async (sha256, part) => {
      const chunk = await db.chunks.get([sha256, part]);
      return chunk === undefined ? null : new Uint8Array(chunk.bytes);
    },
    photoIsWhole: async (sha256) => {
      const photo = await db.photos.get([device, sha256]);
      const bytes = photo === undefined ? null : await originalBytes(db, sha256, photo.bytes);
      if (bytes === null) return false;
      return toHex(new Uint8Array(await crypto.subtle.digest('SHA-256', bytes))) === sha256;
    },
    settlePhoto: async (sha256, as, why) => {
      await db.photos.update([device, sha256], { state: as, why, settledMs: Date.now() });
    },
    reopenPhotos: async (sha256s) => {
      await db.transaction('rw', db.photos, async () => {
        const rows = await db.photos.bulkGet(sha256s.map((sha256): [string, string] => [device, sha256]));
        const lost = rows.flatMap((row) => (row?.state === 'complete' ? [row] : []));
        await db.photos.bulkPut(lost.map((row) => ({ ...row, state: 'pending', settledMs: null })));
      });
    },
  };
}
