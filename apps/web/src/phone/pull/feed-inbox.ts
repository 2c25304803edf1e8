import type { FeedItem } from '@rimeward/contracts';
import type { DeliveryStore, FeedPage, FeedPlace } from '@rimeward/delivery';
import { appVersion } from '../app-version';
import type { PhoneDatabase } from '../database/database';
import type { Owner } from '../database/schema';
import { activeKey } from '../device/enrolment';
import { vaultKey } from '../vault';
import { writeItem } from './apply-item';
import { prepareItem, type PreparedItem } from './prepare-item';

type FeedCalls = Pick<DeliveryStore, 'feedPlace' | 'applyFeed' | 'restartFeed'>;

const nowhere: FeedPlace = { epoch: null, cursor: 0 };

/** The feed's side of the delivery store: items and cursor move together, or not at all. */
export function feedInbox(db: PhoneDatabase, device: string, owner: Owner): FeedCalls {
  const place = async (): Promise<FeedPlace> => {
    const row = await db.read_meta.get('place');
    return row?.key === 'place' ? { epoch: row.epoch, cursor: row.cursor } : nowhere;
  };
  const moveTo = ({ epoch, cursor }: { epoch: string; cursor: number }): Promise<unknown> =>
    db.read_meta.put({ key: 'place', epoch, cursor });
  const tables = [...db.readTables, db.entries, db.meta];
  // Somebody else may have signed in while a page was on its way.
  const stillHere = async (): Promise<boolean> => (await db.meta.get(activeKey))?.value === device;

  return {
    feedPlace: () => db.transaction('rw', db.read_meta, () => startOverAfterUpdate(db).then(place)),
    applyFeed: async (from, page) => {
      // Encryption is a foreign await: it has to be over before the transaction opens.
      const prepared = await prepareAll(db, owner, page);
      return db.transaction('rw', tables, async () => {
        if (!(await stillHere()) || !same(await place(), from)) return false;
        for (const item of prepared) await writeItem(db, device, item);
        if (prepared.some((item) => item.kind === 'unknown'))
          await db.read_meta.put({ key: 'skipped', appVersion });
        await moveTo(page);
        return true;
      });
    },
    restartFeed: (from, epoch) =>
      db.transaction('rw', [...db.readTables, db.meta], async () => {
        if (!(await stillHere()) || !same(await place(), from)) return false;
        await Promise.all(db.readTables.map((table) => table.clear()));
        await moveTo({ epoch, cursor: 0 });
        return true;
      }),
  };
}

async function prepareAll(db: PhoneDatabase, owner: Owner, page: FeedPage): Promise<PreparedItem[]> {
  const key = await vaultKey(owner, db);
  return Promise.all(page.items.map((item) => prepareItem(item as FeedItem, key)));
}

/** An older app skipped items that it did not know: this one reads the feed from its beginning. */
async function startOverAfterUpdate(db: PhoneDatabase): Promise<void> {
  const skipped = await db.read_meta.get('skipped');
  if (skipped?.key !== 'skipped' || skipped.appVersion === appVersion) return;
  const row = await db.read_meta.get('place');
  if (row?.key === 'place') await db.read_meta.put({ ...row, cursor: 0 });
  await db.read_meta.delete('skipped');
}

function same(a: FeedPlace, b: FeedPlace): boolean {
  return a.epoch === b.epoch && a.cursor === b.cursor;
}
