import type { EntityManager } from 'typeorm';
import type { FeedChange, FeedService } from '../feed/feed.service';
import { readHead } from './feed-reader';
import type { DayRange } from '../visibility/assigned-visits';
import { companySetting as company } from '../../database/protect-table';

/** Days back and ahead of today whose visits a phone carries. */
export const windowDays = 14;

/** The days a phone carries, by the company's own calendar. */
export function windowAround(now: Date, timeZone: string): DayRange {
  const day = today(now, timeZone);
  return { from: shiftDay(day, -windowDays), to: shiftDay(day, windowDays) };
}

/** ISO date by a time zone's calendar. */
export function today(now: Date, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  });
  const of = new Map(parts.formatToParts(now).map(({ type, value }) => [type, value]));
  return `${of.get('year')}-${of.get('month')}-${of.get('day')}`;
}

/** ISO date some days on. */
export function shiftDay(isoDate: string, days: number): string {
  const at = new Date(`${isoDate}T00:00:00Z`);
  at.setUTCDate(at.getUTCDate() + days);
  return at.toISOString().slice(0, 10);
}

/**
 * Tells the feed of visits that have come into the window by the passing of days: nothing was written when they did, and a
 * phone that has read past their planning would never hear of them. A feed that is still empty gets its first row, since a
 * reader at position 0 is one who has read nothing.
 */
export async function tellEntering(
  manager: EntityManager,
  feed: FeedService,
  range: DayRange,
): Promise<void> {
  const rows = await manager.query<{ id: string }[]>(
    `select v.id from visits v
     where v.company_id = ${company} and v.date <= $1::date and v.date > $1::date - $2::integer
       and not exists (
         select from feed f where f.company_id = v.company_id and f.visit_id = v.id and f.kind = 'visit'
           and f.at >= v.date - $2::integer)
     order by v.id`,
    [range.to, windowDays],
  );
  const entering: FeedChange[] = rows.map(({ id }) => ({ kind: 'visit', id }));
  const { position } = await readHead(manager);
  const changes: FeedChange[] = position === 0 ? [{ kind: 'company' }, ...entering] : entering;
  if (changes.length > 0) await feed.touch(manager, ...changes);
}
