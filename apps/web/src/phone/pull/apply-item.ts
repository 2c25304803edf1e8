import type { Review } from '@rimeward/contracts';
import type { PhoneDatabase } from '../database/database';
import type { PreparedItem } from './prepare-item';

/** Writes one item of the feed; runs inside the caller's transaction. Writing it twice changes nothing. */
export async function writeItem(db: PhoneDatabase, device: string, item: PreparedItem): Promise<void> {
  switch (item.kind) {
    case 'company':
      await db.read_meta.put({ key: 'company', document: item.document });
      return;
    case 'visit':
      await db.read_visits.put(item.row);
      await Promise.all(item.reviews.map((review) => putReview(db, review)));
      return;
    case 'visit-removed':
      await removeVisit(db, item.id);
      return;
    case 'entry':
      await db.read_entries.put(item.row);
      if (item.row.device === device) await noteStanding(db, device, item.row.seq, item.row.heldReason);
      return;
    case 'review':
      await putReview(db, item.review);
      return;
    case 'unknown':
      return;
  }
}

function putReview(db: PhoneDatabase, review: Review): Promise<unknown> {
  return db.read_reviews.put({ id: review.id, visit: review.visitId, decision: review.decision, review });
}

/** The visit is no longer this person's: what was read of it goes, own entries stay. */
async function removeVisit(db: PhoneDatabase, id: string): Promise<void> {
  await db.read_visits.delete(id);
  await db.read_entries.where({ visitId: id }).delete();
  await db.read_reviews.where({ visit: id }).delete();
}

/** The answer to a push may have been lost: the feed also tells which own entries are held. */
async function noteStanding(
  db: PhoneDatabase,
  device: string,
  seq: number,
  heldReason: string | null,
): Promise<void> {
  const own = await db.entries.get([device, seq]);
  if (own === undefined || (own.heldReason ?? null) === heldReason) return;
  const { heldReason: _before, ...row } = own;
  await db.entries.put(heldReason === null ? row : { ...row, heldReason });
}
