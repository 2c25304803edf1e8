import type { Review } from '@rimeward/contracts';
import type { LogEntry } from '@rimeward/field-log';
import { database } from '../database/database';
import type { ReadEntryRow } from '../database/schema';
import { activeEnrolment } from '../device/enrolment';

/** Every entry of a visit that is here, saved on this phone or pulled, each once. The order means nothing: fold them. */
export async function entriesOfVisit(id: string): Promise<LogEntry[]> {
  const [own, pulled] = await Promise.all([ownEntries(id), pulledRows(id)]);
  const byId = new Map<string, LogEntry>();
  for (const { entry } of pulled) if (entry !== null) byId.set(entry.id, entry);
  for (const entry of own) byId.set(entry.id, entry);
  return [...byId.values()];
}

/** How many pulled entries of a visit this version of the app cannot read: "update the app". */
export async function unreadableOfVisit(id: string): Promise<number> {
  return (await pulledRows(id)).filter(({ entry }) => entry === null).length;
}

/** Decisions on a visit, first to last. */
export async function reviewsOfVisit(id: string): Promise<Review[]> {
  const rows = await database().read_reviews.where({ visit: id }).toArray();
  return rows.map(({ review }) => review).sort((a, b) => a.number - b.number);
}

async function ownEntries(visit: string): Promise<LogEntry[]> {
  const owner = (await activeEnrolment())?.owner;
  if (owner === undefined) return [];
  return (await database().entries.where({ owner, visit }).toArray()).map(({ entry }) => entry);
}

function pulledRows(visitId: string): Promise<ReadEntryRow[]> {
  return database().read_entries.where({ visitId }).toArray();
}
