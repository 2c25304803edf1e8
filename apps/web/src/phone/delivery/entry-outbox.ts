import type { DeliveryStore, HeldEntry } from '@rimeward/delivery';
import { appVersion } from '../app-version';
import type { PhoneDatabase } from '../database/database';
import { chainMarks } from './chain-marks';

type EntryCalls = Pick<
  DeliveryStore,
  'standing' | 'manifest' | 'entriesAfter' | 'textAt' | 'acknowledge' | 'noteHeld' | 'rewind'
>;

/**
 * The entries' side of the delivery store. The outbox is what follows the acknowledged mark: moving the mark, in the
 * transaction that stores the receipt, is the only way out of it.
 */
export function entryOutbox(db: PhoneDatabase, device: string): EntryCalls {
  const between = (first: number, last: number) =>
    db.entries.where('[device+seq]').between([device, first], [device, last], true, true);

  const noteHeld = async (held: readonly HeldEntry[]): Promise<void> => {
    for (const { seq, reason } of held) await db.entries.update([device, seq], { heldReason: reason });
  };

  return {
    standing: async () => ({ device, ...(await chainMarks(db, device)) }),
    manifest: () =>
      db.transaction('r', db.chains, db.entries, db.photos, async () => {
        const { head, acknowledged } = await chainMarks(db, device);
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
      const rows = await between(seq + 1, seq + limit).toArray();
      const gap = rows.findIndex((row, index) => row.seq !== seq + 1 + index);
      return rows.slice(0, gap === -1 ? rows.length : gap).map((row) => ({ seq: row.seq, text: row.text }));
    },
    textAt: async (seq) => (await db.entries.get([device, seq]))?.text ?? null,
    acknowledge: ({ through, receipt, receiptVerified, held, atMs }) =>
      db.transaction('rw', db.chains, db.entries, db.receipts, async () => {
        const { acknowledged } = await chainMarks(db, device);
        await noteHeld(held);
        if (through.seq < acknowledged.seq) return;
        const { seq, hash } = through;
        await db.receipts.put({ device, through: seq, hash, receipt, verified: receiptVerified, atMs });
        const row = await db.entries.get([device, seq]);
        const bytesThrough = row?.bytesThrough ?? acknowledged.bytesThrough;
        await db.chains.put({ device, acknowledged: { seq, hash, bytesThrough } });
        if (!receiptVerified) return;
        // A verified receipt covers everything before it.
        await db.receipts.where('[device+through]').between([device, 0], [device, seq], true, false).delete();
      }),
    noteHeld: (held) => db.transaction('rw', db.entries, () => noteHeld(held)),
    rewind: (from, to) =>
      db.transaction('rw', db.chains, db.entries, db.receipts, async () => {
        const { acknowledged } = await chainMarks(db, device);
        if (acknowledged.seq !== from.seq) return true;
        const next = await db.entries.get([device, to.seq + 1]);
        if (next === undefined || (await between(to.seq + 1, from.seq).count()) !== from.seq - to.seq)
          return false;
        const bytesThrough = next.bytesThrough - next.byteLength;
        await db.receipts
          .where('[device+through]')
          .between([device, to.seq], [device, Infinity], false, true)
          .delete();
        await db.chains.put({ device, acknowledged: { ...to, bytesThrough } });
        return true;
      }),
  };
}
