import { Dexie, type EntityTable, type Table } from 'dexie';
import type * as rows from './schema';
import { stores } from './schema';

export const databaseName = 'rimeward';

/**
 * Everything that this phone keeps. All writing is strict: a transaction has completed only when the browser has
 * handed it to the disk.
 */
export class PhoneDatabase extends Dexie {
  declare meta: EntityTable<rows.MetaRow, 'key'>;
  declare devices: EntityTable<rows.Enrolment, 'deviceId'>;
  declare chains: EntityTable<rows.ChainRow, 'device'>;
  declare entries: Table<rows.EntryRow, [string, number]>;
  declare photos: Table<rows.PhotoRow, [string, string]>;
  declare chunks: Table<rows.ChunkRow, [string, number]>;
  declare previews: EntityTable<rows.PreviewRow, 'sha256'>;
  declare drafts: Table<rows.DraftRow, [string, string]>;
  declare intents: EntityTable<rows.Intent, 'id'>;
  declare receipts: Table<rows.ReceiptRow, [string, number]>;
  declare keys: EntityTable<rows.KeyRow, 'owner'>;
  declare ballast: EntityTable<rows.BallastRow, 'n'>;
  declare read_visits: EntityTable<rows.ReadVisitRow, 'id'>;
  declare read_entries: Table<rows.ReadEntryRow, [string, number]>;
  declare read_reviews: EntityTable<rows.ReadReviewRow, 'id'>;
  declare read_meta: Table<rows.ReadMetaRow, string>;

  constructor(name: string = databaseName) {
    // No cache: its optimistic results would show an entry before it is committed.
    super(name, { chromeTransactionDurability: 'strict', cache: 'disabled' });
    this.version(1).stores(stores);
  }

  /** Tables of what was pulled: they can be dropped at any time. */
  get readTables(): Table[] {
    return [this.read_visits, this.read_entries, this.read_reviews, this.read_meta];
  }
}

let current: PhoneDatabase | null = null;

/** The one database of this page. */
export function database(): PhoneDatabase {
  current ??= watched(new PhoneDatabase());
  return current;
}

export type DatabaseNotice = 'reload-needed' | 'blocked' | 'closed';
type Listener = (notice: DatabaseNotice) => void;
const listeners = new Set<Listener>();

/** Tells what needs a person's word: another tab has upgraded, holds an upgrade up, or the browser closed the database. */
export function onDatabaseNotice(listener: Listener): () => void {
  listeners.add(listener);
  return () => void listeners.delete(listener);
}

function watched(opened: PhoneDatabase): PhoneDatabase {
  const tell = (notice: DatabaseNotice): void => listeners.forEach((listener) => listener(notice));
  opened.on('versionchange', () => {
    opened.close({ disableAutoOpen: true });
    tell('reload-needed');
    return false;
  });
  opened.on('blocked', () => tell('blocked'));
  opened.on('close', () => tell('closed'));
  return opened;
}

/** Lets go of the connection; the next `database()` is a new one. */
export function closeDatabase(): void {
  current?.close({ disableAutoOpen: true });
  current = null;
}
