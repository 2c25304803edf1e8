import { emptyChain } from '@rimeward/delivery';
import type { PhoneDatabase } from '../database/database';
import type { ChainMark, EntryRow } from '../database/schema';

/** Before the first entry of a device. */
export const chainStart: ChainMark = { ...emptyChain, bytesThrough: 0 };

/** Both ends of what is still to be sent. */
export interface ChainMarks {
  head: ChainMark;
  acknowledged: ChainMark;
}

/** Reads them: two look-ups, however long the chain is. */
export async function chainMarks(db: PhoneDatabase, device: string): Promise<ChainMarks> {
  const [row, last] = await Promise.all([db.chains.get(device), lastEntry(db, device)]);
  return {
    head: last === undefined ? chainStart : markOf(last),
    acknowledged: row?.acknowledged ?? chainStart,
  };
}

/** The newest entry of a device. It is never tidied away: it is the head of the chain. */
export function lastEntry(db: PhoneDatabase, device: string): Promise<EntryRow | undefined> {
  return db.entries.where('[device+seq]').between([device, 0], [device, Infinity]).last();
}

export function markOf({ seq, hash, bytesThrough }: EntryRow): ChainMark {
  return { seq, hash, bytesThrough };
}
