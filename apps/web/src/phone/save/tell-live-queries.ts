import { Dexie, RangeSet, type ObservabilitySet } from 'dexie';
import type { PhoneDatabase } from '../database/database';
import type { Written } from './entry-transaction';

/**
 * Tells the live queries of every tab what a transaction that went past Dexie has written: the same parts that Dexie
 * would have told itself.
 */
export function tellLiveQueries(db: PhoneDatabase, { row, photos }: Written): void {
  const parts: ObservabilitySet = {};
  const changed = (table: string, index: string, keys: unknown[]): void => {
    parts[`idb://${db.name}/${table}/${index}`] = new RangeSet().addKeys(keys as never[]);
  };
  changed('entries', '', [[row.device, row.seq]]);
  changed('entries', ':dels', [[row.device, row.seq]]);
  changed('entries', '[owner+visit]', [[row.owner, row.visit]]);
  if (photos.length > 0) {
    changed(
      'photos',
      '',
      photos.map(({ device, sha256 }) => [device, sha256]),
    );
    changed(
      'photos',
      ':dels',
      photos.map(({ device, sha256 }) => [device, sha256]),
    );
    changed(
      'photos',
      '[device+state]',
      photos.flatMap(({ device }) => [
        [device, 'loose'],
        [device, 'pending'],
      ]),
    );
  }
  Dexie.on('storagemutated').fire(parts);
}
