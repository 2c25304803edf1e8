import { Injectable } from '@nestjs/common';
import type { PullResponse } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import type { Principal } from '../../auth/principal';
import { CompanyContext } from '../../database/company-context';
import { companySetting as company } from '../../database/protect-table';
import { FeedService } from '../feed/feed.service';
import { assignedVisits, type DayRange } from '../visibility/assigned-visits';
import { FeedItems } from './feed-items.service';
import { readFeed, readHead } from './feed-reader';
import { tellEntering, windowAround, windowDays } from './window';

export interface PullQuery {
  epoch: string | null;
  cursor: number;
  limit: number;
}

const dayMs = 24 * 3_600_000;

/** Gives a phone what has changed in the visits of its person. */
@Injectable()
export class PullService {
  /** Day for which this process has told each company's entering visits. */
  private readonly told = new Map<string, string>();

  constructor(
    private readonly context: CompanyContext,
    private readonly feed: FeedService,
    private readonly feedItems: FeedItems,
  ) {}

  async pull(reader: Principal, query: PullQuery): Promise<PullResponse> {
    const now = new Date();
    const { range, response } = await this.context.run(reader.companyId, async (manager) => {
      const days = windowAround(now, await timeZoneOf(manager));
      if (this.told.get(reader.companyId) !== days.to) await tellEntering(manager, this.feed, days);
      return { range: days, response: await this.read(manager, reader, query, days, now) };
    });
    this.told.set(reader.companyId, range.to);
    return response;
  }

  private async read(
    manager: EntityManager,
    reader: Principal,
    query: PullQuery,
    range: DayRange,
    now: Date,
  ): Promise<PullResponse> {
    // The head first: whatever is assigned by then is seen by the next statement, whatever comes later has a later position.
    const head = await readHead(manager);
    const known = query.epoch === head.epoch && query.cursor <= head.position;
    const after = known ? query.cursor : 0;
    const visible = await assignedVisits(manager, reader.userId, range);
    const rows = await readFeed(manager, {
      userId: reader.userId,
      visits: visible,
      ownSince: new Date(now.getTime() - windowDays * dayMs),
      after,
      through: head.position,
      limit: query.limit + 1,
    });
    const more = rows.length > query.limit;
    const page = rows.slice(0, query.limit);
    return {
      epoch: head.epoch,
      cursor: more ? (page.at(-1)?.position ?? after) : head.position,
      more,
      items: await this.feedItems.of(manager, { after, visible, rows: page }),
      serverTime: now.toISOString(),
    };
  }
}

async function timeZoneOf(manager: EntityManager): Promise<string> {
  const rows = await manager.query<{ zone: string }[]>(
    `select settings->>'timeZone' as zone from companies where id = ${company}`,
  );
  const zone = rows[0]?.zone;
  if (zone === undefined) throw new Error('a company without a calendar');
  return zone;
}
