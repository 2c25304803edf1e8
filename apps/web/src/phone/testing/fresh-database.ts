import { Dexie } from 'dexie';
import { IDBFactory } from 'fake-indexeddb';
import { vi } from 'vitest';
import { closeDatabase } from '../database/database';

/** An empty browser storage for the next test. */
export function freshDatabase(): void {
  closeDatabase();
  const factory = new IDBFactory();
  vi.stubGlobal('indexedDB', factory);
  Dexie.dependencies.indexedDB = factory;
}
