import type { CompanyDocument, Review, Session, StoredEntry, VisitDocument } from '@rimeward/contracts';
import type { ChainHead } from '@rimeward/delivery';
import type { LogEntry } from '@rimeward/field-log';

/** One person in one company on this phone: `<company>/<user>`. Nobody's rows are shown or sent as another's. */
export type Owner = string;

export interface MetaRow {
  key: string;
  value: unknown;
}

/** Row `active` of `meta`: whose phone it is now. */
export interface ActiveRow extends MetaRow {
  value: string;
  owner: Owner;
}

/** What the office gave this browser's storage when it was enrolled, and who works with it. */
export interface Enrolment {
  deviceId: string;
  owner: Owner;
  ingestSecret: string;
  /** Public key, JWK, that leases and receipts are signed with. */
  verifyKey: Record<string, unknown>;
  lease: string | null;
  user: Session['user'];
  company: Session['company'];
  enrolledMs: number;
  /** Given up for a new device after a fork or a revocation. */
  leftBehind?: boolean;
}

/** One end of a chain, with the bytes of all entries up to it, so that what is pending needs no counting. */
export interface ChainMark extends ChainHead {
  bytesThrough: number;
}

/** How far the office has acknowledged a device's chain. What comes after it in `entries` is the outbox. */
export interface ChainRow {
  device: string;
  acknowledged: ChainMark;
}

export interface EntryRow {
  device: string;
  seq: number;
  id: string;
  owner: Owner;
  visit: string;
  /** Exact text; its UTF-8 bytes are what is hashed and sent. */
  text: string;
  hash: string;
  byteLength: number;
  bytesThrough: number;
  /** Parsed form of `text`. */
  entry: LogEntry;
  savedMs: number;
  /** Why the office keeps it aside; absent when it does not, so that the index holds only those. */
  heldReason?: string;
}

/**
 * `storing`: its bytes are not all here yet · `loose`: whole, named by no entry · `pending`: the office lacks it · `damaged`: the
 * phone lost some of its bytes.
 */
export type PhotoState = 'storing' | 'loose' | 'pending' | 'complete' | 'refused' | 'damaged';

export interface PhotoRow {
  device: string;
  sha256: string;
  owner: Owner;
  bytes: number;
  type: string;
  state: PhotoState;
  why: string | null;
  /** Visit whose entry names it; null while it is loose. */
  visit: string | null;
  storedMs: number;
  settledMs: number | null;
}

export interface ChunkRow {
  sha256: string;
  n: number;
  bytes: ArrayBuffer;
}

export interface PreviewRow {
  sha256: string;
  type: string;
  bytes: ArrayBuffer;
}

export interface DraftRow {
  owner: Owner;
  key: string;
  value: unknown;
  changedMs: number;
}

/** A field for which the camera was opened: the page may be killed before the picture comes back. */
export interface Intent {
  id: string;
  owner: Owner;
  visit: string;
  field: string;
  detail: unknown;
  openedMs: number;
}

export interface ReceiptRow {
  device: string;
  through: number;
  hash: string;
  receipt: string;
  verified: boolean;
  atMs: number;
}

export interface KeyRow {
  owner: Owner;
  key: CryptoKey;
}

export interface BallastRow {
  n: number;
  bytes: ArrayBuffer;
}

/** Encrypted text; null stands for "the office has none". */
export interface Sealed {
  iv: Uint8Array<ArrayBuffer>;
  cipher: ArrayBuffer;
}

export interface ReadVisitRow {
  id: string;
  date: string;
  /** Without access notes and gate code. */
  document: VisitDocument;
  access: Sealed | null;
}

export interface ReadEntryRow extends StoredEntry {
  /** Null when this version of the app cannot read it. */
  entry: LogEntry | null;
}

export interface ReadReviewRow {
  id: string;
  visit: string;
  decision: Review['decision'];
  review: Review;
}

/** `place` in the feed and `company` document: dropped together with everything else that was read. */
export type ReadMetaRow =
  | { key: 'place'; epoch: string; cursor: number }
  | { key: 'company'; document: CompanyDocument }
  | { key: 'skipped'; appVersion: string };

/** Dexie's index texts. Only what a query needs is indexed: every index is paid for at each save. */
export const stores = {
  meta: 'key',
  devices: 'deviceId, owner',
  chains: 'device',
  entries: '[device+seq], [owner+visit], [device+heldReason]',
  photos: '[device+sha256], device, sha256, [device+state]',
  chunks: '[sha256+n]',
  previews: 'sha256',
  drafts: '[owner+key]',
  intents: 'id, owner',
  receipts: '[device+through]',
  keys: 'owner',
  ballast: 'n',
  read_visits: 'id, [date+id]',
  read_entries: '[device+seq], visitId',
  read_reviews: 'id, visit, decision',
  read_meta: 'key',
} as const;
