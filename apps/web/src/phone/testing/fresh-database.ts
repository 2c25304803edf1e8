import { Dexie } from 'dexie';
import { IDBFactory } from 'fake-indexeddb';
import { vi } from 'vitest';
import { forgetHead } from '../save/known-head';
import { closeDatabase } from '../database/database';

/** An empty browser storage for the next test. */
export function freshDatabase(): void {
  closeDatabase();
  forgetHead();
  const factory = new IDBFactory();
  vi.stubGlobal('indexedDB', factory);
  Dexie.dependencies.indexedDB = factory;
}
