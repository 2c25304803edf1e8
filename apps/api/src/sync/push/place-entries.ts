import type { HeldReason, PushResponse } from '@rimeward/contracts';
import type { ReadEntry } from './read-entry';

/** Newest link of a device's chain as the office has it. */
export interface ChainHead {
  seq: number;
  hash: string;
}

export interface KnownEntry {
  hash: string;
  heldReason: HeldReason | null;
}

/** What the database says about a batch, read under the lock of the device's chain. */
export interface Surroundings {
  company: string;
  device: string;
  deviceRevoked: boolean;
  head: ChainHead;
  /** First number that has not been acknowledged, by the phone's own account. */
  firstPending: number;
  /** Entries of this device that the office has, for the sequence numbers of the batch. */
  known: ReadonlyMap<number, KnownEntry>;
  visits: ReadonlySet<string>;
  /** Whose device it is: he alone writes on it. */
  person: string;
}

export interface PlacedEntry {
  seq: number;
  entry: ReadEntry;
  heldReason: HeldReason | null;
}

/** An entry that has no place in the chain: kept beside it, shown as held. `seq` 0 when it names none. */
export interface StrayEntry {
  seq: number;
  entry: ReadEntry;
  heldReason: HeldReason;
}

export interface Placement {
  append: PlacedEntry[];
  strays: StrayEntry[];
  /** One for each entry of the batch, in its order. */
  results: PushResponse['results'];
  head: ChainHead;
}

/** Decides what becomes of each entry of a batch. Nothing is refused: what does not fit is held for a person. */
export function placeEntries(batch: readonly ReadEntry[], around: Surroundings): Placement {
  const known = new Map(around.known);
  const placement: Placement = { append: [], strays: [], results: [], head: around.head };
  batch.forEach((entry, index) => {
    const seq = entry.header?.seq ?? impliedSeq(batch, index, around);
    placeOne(entry, seq, around, known, placement);
  });
  return placement;
}

function placeOne(
  entry: ReadEntry,
  seq: number | null,
  around: Surroundings,
  known: Map<number, KnownEntry>,
  placement: Placement,
): void {
  const { head, results } = placement;
  const stray = (heldReason: HeldReason): void => {
    placement.strays.push({ seq: seq ?? 0, entry, heldReason });
    results.push({ seq: seq ?? 0, result: 'held', heldReason });
  };
  if (seq === null) return stray('unreadable');
  if (entry.header !== null && entry.header.device !== around.device) return stray('chain-broken');
  if (seq > head.seq + 1) {
    results.push({ seq, result: 'gap' });
    return;
  }
  if (seq <= head.seq) {
    const before = known.get(seq);
    if (before?.hash !== entry.hash) return stray('fork');
    results.push({ seq, result: 'duplicate', ...(before.heldReason && { heldReason: before.heldReason }) });
    return;
  }
  const heldReason = reasonToHold(entry, head, around);
  placement.append.push({ seq, entry, heldReason });
  placement.head = { seq, hash: entry.hash };
  known.set(seq, { hash: entry.hash, heldReason });
  results.push(heldReason === null ? { seq, result: 'stored' } : { seq, result: 'held', heldReason });
}

function reasonToHold(entry: ReadEntry, head: ChainHead, around: Surroundings): HeldReason | null {
  if (entry.fault === 'unreadable') return 'unreadable';
  if (entry.prev !== head.hash) return 'chain-broken';
  if (around.deviceRevoked) return 'device-revoked';
  if (entry.fault !== null) return entry.fault;
  if (entry.company !== around.company || entry.visit === null || !around.visits.has(entry.visit))
    return 'foreign-visit';
  if (entry.actor !== around.person) return 'foreign-actor';
  return null;
}

/**
 * The number that an unreadable entry must have had: phones send their entries in order and without gaps, so a readable
 * neighbour tells it by its distance, and so does what the phone says of its outbox. Without it one damaged entry would
 * hold up all that follow; a wrong guess loses nothing, since the true bearer of the number would be kept as a fork.
 */
function impliedSeq(batch: readonly ReadEntry[], index: number, around: Surroundings): number | null {
  const anchor = batch.findIndex((entry) => entry.header?.device === around.device);
  const first = batch[anchor]?.header;
  const seq = first ? first.seq - anchor + index : around.firstPending + index;
  return seq >= 1 ? seq : null;
}
