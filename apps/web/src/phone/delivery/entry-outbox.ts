import type { ChainHead, DeliveryStore, HeldEntry } from '@rimeward/delivery';
import { Dexie } from 'dexie';
import { appVersion } from '../app-version';
import type { PhoneDatabase } from '../database/database';
import type { ChainMark, ChainRow } from '../database/schema';
import { emptyChainRow } from './chain-row';

type EntryCalls = Pick<
  DeliveryStore,
  'standing' | 'manifest' | 'entriesAfter' | 'textAt' | 'acknowledge' | 'noteHeld' | 'rewind'
>;

/** The entries' side of the delivery store. */
export function entryOutbox(db: PhoneDatabase, device: string): EntryCalls {
  const chain = async (): Promise<ChainRow> => (await db.chains.get(device)) ?? emptyChainRow(device);

  const markAt = async ({ seq, hash }: ChainHead): Promise<ChainMark | null> => {
    if (seq === 0) return emptyChainRow(device).head;
    const row = await db.entries.get([device, seq]);
    return row === undefined ? null : { seq, hash, bytesThrough: row.bytesThrough };
  };

  const noteHeld = async (held: readonly HeldEntry[]): Promise<void> => {
    for (const { seq, reason } of held) await db.entries.update([device, seq], { heldReason: reason });
  };

  return {
    standing: async () => {
      const { head, acknowledged } = await chain();
      return { device, head, acknowledged };
    },
    manifest: () =>
      db.transaction('r', db.chains, db.entries, db.photos, async () => {
        const { head, acknowledged } = await chain();
        const oldest = await db.entries.get([device, acknowledged.seq + 1]);
        const photos = await db.photos.where({ device, state: 'pending' }).toArray();
        const photoBytes = photos.reduce((sum, photo) => sum + photo.bytes, 0);
        return {
          head: head.seq,
          pendingEntries: head.seq - acknowledged.seq,
          pendingPhotos: photos.length,
          pendingBytes: head.bytesThrough - acknowledged.bytesThrough + photoBytes,
          oldestPendingWall: oldest?.entry.time.wall ?? null,
          appVersion,
        };
      }),
    entriesAfter: async (seq, limit) => {
      const rows = await db.entries
        .where('[device+seq]')
        .between([device, seq + 1], [device, seq + limit], true, true)
        .toArray();
      const dense = rows.findIndex((row, index) => row.seq !== seq + 1 + index);
      return rows
        .slice(0, dense === -1 ? rows.length : dense)
        .map((row) => ({ seq: row.seq, text: row.text }));
    },
    textAt: async (seq) => (await db.entries.get([device, seq]))?.text ?? null,
    acknowledge: ({ through, receipt, receiptVerified, held, atMs }) =>
      db.transaction('rw', db.chains, db.entries, db.outbox, db.receipts, async () => {
        const row = await chain();
        await noteHeld(held);
        if (through.seq < row.acknowledged.seq) return;
        await db.receipts.put({
          device,
          through: through.seq,
          hash: through.hash,
          receipt,
          verified: receiptVerified,
          atMs,
        });
        await db.outbox
          .where('[device+seq]')
          .between([device, Dexie.minKey], [device, through.seq], true, true)
          .delete();
        const acknowledged = (await markAt(through)) ?? { ...row.acknowledged, ...through };
        await db.chains.put({ ...row, acknowledged });
        if (!receiptVerified) return;
        // A verified receipt covers everything before it.
        const older = db.receipts
          .where('[device+through]')
          .between([device, Dexie.minKey], [device, through.seq], true, false);
        await older.delete();
      }),
    noteHeld: (held) => db.transaction('rw', db.entries, () => noteHeld(held)),
    rewind: (from, to) =>
      db.transaction('rw', db.chains, db.entries, db.outbox, db.receipts, async () => {
        const row = await chain();
        if (row.acknowledged.seq !== from.seq) return true;
        const next = await db.entries.get([device, to.seq + 1]);
        const kept = await db.entries
          .where('[device+seq]')
          .between([device, to.seq + 1], [device, from.seq], true, true)
          .primaryKeys();
        if (next === undefined || kept.length !== from.seq - to.seq) return false;
        const acknowledged = { ...to, bytesThrough: next.bytesThrough - next.byteLength };
        await db.outbox.bulkPut(kept.map(([, seq]) => ({ device, seq })));
        await db.receipts
          .where('[device+through]')
          .between([device, to.seq], [device, Dexie.maxKey], false, true)
          .delete();
        await db.chains.put({ ...row, acknowledged });
        return true;
      }),
  };
}
