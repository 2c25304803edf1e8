import type { ChainHead } from '../chain/seal-entry';
import type { FeedPlace, PhoneManifest, PhotoToSend } from './transport';

/** Both ends of what is still to be sent. */
export interface ChainStanding {
  device: string;
  head: ChainHead;
  /** Newest entry that a stored receipt covers. */
  acknowledged: ChainHead;
}

export interface OutgoingEntry {
  seq: number;
  text: string;
}

/** An entry that the office keeps aside for a person. */
export interface HeldEntry {
  seq: number;
  reason: string;
}

export interface Acknowledgement {
  through: ChainHead;
  /** The office's signed word for it, kept as it came. */
  receipt: string;
  /** False when the signature could not be checked with the key at hand: such an entry is never tidied away. */
  receiptVerified: boolean;
  held: readonly HeldEntry[];
  atMs: number;
}

/** Estimate of the office's clock. */
export interface Contact {
  serverTimeMs: number;
  sentMs: number;
  receivedMs: number;
}

export interface FeedPage {
  epoch: string;
  cursor: number;
  items: readonly unknown[];
}

/**
 * The phone's database as delivery sees it, bound to one device's chain. Each call is one transaction. A call
 * rejects when the database fails; the round then ends and the next one is scheduled.
 */
export interface DeliveryStore {
  standing: () => Promise<ChainStanding>;
  manifest: () => Promise<PhoneManifest>;
  /** Entries that follow `seq`, in sequence, at most `limit`; stops at the first one that is not there. */
  entriesAfter: (seq: number, limit: number) => Promise<OutgoingEntry[]>;
  /** Exact text of one entry of this device; null when it is not kept any more. */
  textAt: (seq: number) => Promise<string | null>;
  /** Stores the receipt and removes the outbox rows that it covers, in one transaction. Never moves backwards. */
  acknowledge: (acknowledgement: Acknowledgement) => Promise<void>;
  noteHeld: (held: readonly HeldEntry[]) => Promise<void>;
  /**
   * The office has been restored to an earlier day: puts the entries after `to` back into the outbox.
   * Does nothing when the standing is no longer `from`. False when an entry in between is not kept any more.
   */
  rewind: (from: ChainHead, to: ChainHead) => Promise<boolean>;
  noteContact: (contact: Contact) => Promise<void>;

  /** Photographs that saved entries name and the office does not have, oldest first. */
  pendingPhotos: (limit: number) => Promise<PhotoToSend[]>;
  readPreview: (sha256: string) => Promise<Uint8Array | null>;
  /** Part `part` of `partBytes` bytes each; null when the phone has lost it. */
  readPart: (sha256: string, part: number, partBytes: number) => Promise<Uint8Array | null>;
  /** Whether the stored bytes still have the hash that names them. */
  photoIsWhole: (sha256: string) => Promise<boolean>;
  settlePhoto: (sha256: string, as: 'complete' | 'refused' | 'damaged', why: string | null) => Promise<void>;
  /** The office lacks photographs that it once had. */
  reopenPhotos: (sha256s: readonly string[]) => Promise<void>;

  feedPlace: () => Promise<FeedPlace>;
  /** Applies a page and moves the cursor in one transaction; false, and nothing done, when the place is no longer `from`. */
  applyFeed: (from: FeedPlace, page: FeedPage) => Promise<boolean>;
  /** Drops what was read, and nothing else, and begins at 0 of another epoch. */
  restartFeed: (from: FeedPlace, epoch: string) => Promise<boolean>;
}
