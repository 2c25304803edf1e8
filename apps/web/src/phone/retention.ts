import { Dexie } from 'dexie';
import { database, type PhoneDatabase } from './database/database';
import { lastEntry } from './delivery/chain-marks';
import type { PhotoState } from './database/schema';
import { namedPhotos } from './photos/named-photos';

const dayMs = 24 * 3_600_000;
/** How long things stay after the office has them, and photographs that belong to no entry in any case. */
const keepEntriesMs = 30 * dayMs;
const keepPhotosMs = 7 * dayMs;
const keepLooseMs = 2 * dayMs;
/** `storing`: the page was killed while it was being stored. */
const unnamed: readonly PhotoState[] = ['loose', 'storing'];
const tidiedKey = 'tidied';

/** Tidies once a day; called after rounds. */
export async function tidyDaily(nowMs = Date.now(), db: PhoneDatabase = database()): Promise<void> {
  const last = (await db.meta.get(tidiedKey))?.value;
  if (typeof last === 'number' && nowMs - last < dayMs && nowMs >= last) return;
  await tidy(nowMs, db);
  await db.meta.put({ key: tidiedKey, value: nowMs });
}

/**
 * Removes what the office verifiably has had for long enough: entries under a verified receipt of 30 days ago,
 * photographs complete for 7 days, photographs and chunks that no entry, draft or intent has named for 48 h. An entry that
 * is held stays until it is settled; nothing unsent is ever touched.
 */
export async function tidy(nowMs = Date.now(), db: PhoneDatabase = database()): Promise<void> {
  await tidyEntries(db, nowMs);
  await tidyPhotos(db, nowMs);
}

async function tidyEntries(db: PhoneDatabase, nowMs: number): Promise<void> {
  for (const { device, acknowledged } of await db.chains.toArray()) {
    await db.transaction('rw', db.entries, db.receipts, async () => {
      const receipts = await db.receipts
        .where('[device+through]')
        .between([device, 0], [device, Infinity])
        .toArray();
      const verified = receipts.filter((receipt) => receipt.verified).map(({ through }) => through);
      const head = await lastEntry(db, device);
      const through = Math.min(Math.max(0, ...verified), acknowledged.seq, (head?.seq ?? 1) - 1);
      await db.entries
        .where('[device+seq]')
        .between([device, 0], [device, through], true, true)
        .and((row) => nowMs - row.savedMs > keepEntriesMs && row.heldReason === undefined)
        .delete();
    });
  }
}

async function tidyPhotos(db: PhoneDatabase, nowMs: number): Promise<void> {
  const named = await namedPhotos(db);
  const done = await db.photos
    .filter(
      (photo) =>
        (photo.state === 'complete' && nowMs - (photo.settledMs ?? nowMs) > keepPhotosMs) ||
        (unnamed.includes(photo.state) && nowMs - photo.storedMs > keepLooseMs && !named.has(photo.sha256)),
    )
    .toArray();
  for (const photo of done) {
    await db.transaction('rw', db.photos, db.chunks, db.previews, async () => {
      const now = await db.photos.get([photo.device, photo.sha256]);
      if (now?.state !== photo.state) return;
      await db.photos.delete([photo.device, photo.sha256]);
      if ((await db.photos.where({ sha256: photo.sha256 }).count()) > 0) return;
      await removeBytes(db, photo.sha256);
    });
  }
}

async function removeBytes(db: PhoneDatabase, sha256: string): Promise<void> {
  await db.chunks.where('[sha256+n]').between([sha256, Dexie.minKey], [sha256, Dexie.maxKey]).delete();
  await db.previews.delete(sha256);
}
