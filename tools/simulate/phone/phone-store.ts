import type { ChainHead, DeliveryStore } from '@rimeward/delivery';
import { sha256Hex } from '../codec';
import type { PhoneDisk } from './phone-disk';

/** Runs one transaction on the disk: with its delay, and with death before or after it. */
export type Transact = <T>(change: () => T) => Promise<T>;

/** Hears what the phone takes for delivered, at the moment when it does. */
export interface Watch {
  acknowledged: (through: ChainHead) => void;
  photoComplete: (sha256: string) => void;
}

/** The delivery's store on a simulated disk. Each call is one transaction, as on the real phone. */
export function phoneStore(disk: PhoneDisk, transact: Transact, watch: Watch): DeliveryStore {
  return {
    standing: () =>
      transact(() => ({ device: disk.device, head: disk.head, acknowledged: disk.acknowledged })),
    manifest: () =>
      transact(() => ({
        head: disk.head.seq,
        pendingEntries: disk.outbox.size,
        pendingPhotos: [...disk.photos.values()].filter(({ state }) => state === 'pending').length,
        pendingBytes: 0,
        oldestPendingWall: null,
        appVersion: 'simulated',
      })),
    entriesAfter: (seq, limit) =>
      transact(() => {
        const entries: { seq: number; text: string }[] = [];
        for (let next = seq + 1; entries.length < limit; next += 1) {
          const entry = disk.entries.get(next);
          if (entry === undefined) break;
          entries.push({ seq: next, text: entry.text });
        }
        return entries;
      }),
    textAt: (seq) => transact(() => disk.entries.get(seq)?.text ?? null),
    acknowledge: ({ through, receipt }) =>
      transact(() => {
        if (through.seq < disk.acknowledged.seq) return;
        watch.acknowledged(through);
        disk.receipts.push(receipt);
        for (const seq of disk.outbox) if (seq <= through.seq) disk.outbox.delete(seq);
        disk.acknowledged = through;
      }),
    noteHeld: () => transact(() => undefined),
    rewind: (from, to) =>
      transact(() => {
        if (disk.acknowledged.seq !== from.seq) return true;
        for (let seq = to.seq + 1; seq <= from.seq; seq += 1) disk.outbox.add(seq);
        disk.acknowledged = to;
        disk.receipts = [];
        return true;
      }),
    noteContact: () => transact(() => undefined),
    pendingPhotos: (limit) =>
      transact(() =>
        [...disk.photos]
          .filter(([, { state }]) => state === 'pending')
          .slice(0, limit)
          .map(([sha256, { content, type }]) => ({ sha256, bytes: content.length, type })),
      ),
    readPreview: () => transact(() => null),
    readPart: (sha256, part, partBytes) =>
      transact(() => {
        const content = disk.photos.get(sha256)?.content;
        const bytes = content?.subarray(part * partBytes, (part + 1) * partBytes);
        return bytes === undefined || bytes.length === 0 ? null : bytes;
      }),
    photoIsWhole: (sha256) =>
      transact(() => sha256Hex(disk.photos.get(sha256)?.content ?? new Uint8Array()) === sha256),
    settlePhoto: (sha256, as) =>
      transact(() => {
        const photo = disk.photos.get(sha256);
        if (as === 'complete') watch.photoComplete(sha256);
        if (photo !== undefined) disk.photos.set(sha256, { ...photo, state: as });
      }),
    reopenPhotos: (sha256s) =>
      transact(() => {
        for (const sha256 of sha256s) {
          const photo = disk.photos.get(sha256);
          if (photo?.state === 'complete') disk.photos.set(sha256, { ...photo, state: 'pending' });
        }
      }),
    feedPlace: () => transact(() => disk.place),
    applyFeed: (from, page) =>
      transact(() => {
        if (from.epoch !== disk.place.epoch || from.cursor !== disk.place.cursor) return false;
        for (const item of page.items) disk.seen.push((item as { position: number }).position);
        disk.place = { epoch: page.epoch, cursor: page.cursor };
        return true;
      }),
    restartFeed: (from, epoch) =>
      transact(() => {
        if (from.epoch !== disk.place.epoch || from.cursor !== disk.place.cursor) return false;
        disk.seen = [];
        disk.place = { epoch, cursor: 0 };
        return true;
      }),
  };
}
