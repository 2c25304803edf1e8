import type { DeliveryStore } from '@rimeward/delivery';
import { noteServerTime } from '../clock/known-time';
import type { PhoneDatabase } from '../database/database';
import type { Owner } from '../database/schema';
import { feedInbox } from '../pull/feed-inbox';
import { entryOutbox } from './entry-outbox';
import { photoOutbox } from './photo-outbox';

/** The phone's database as delivery sees it: one person's device, one chain. */
export function deliveryStore(db: PhoneDatabase, device: string, owner: Owner): DeliveryStore {
  return {
    ...entryOutbox(db, device),
    ...photoOutbox(db, device),
    ...feedInbox(db, device, owner),
    noteContact: (contact) => noteServerTime(contact, db),
  };
}
