import { Injectable } from '@nestjs/common';
import type { PullResponse } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import type { Principal } from '../../auth/principal';
import { CompanyDocumentsService } from '../../companies/company-documents.service';
import { CompanyContext } from '../../database/company-context';
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
    private readonly companies: CompanyDocumentsService,
    private readonly feed: FeedService,
    private readonly feedItems: FeedItems,
  ) {}

  async pull(reader: Principal, query: PullQuery): Promise<PullResponse> {
    const now = new Date();
    const range = await this.window(reader.companyId, now);
    return this.context.run(reader.companyId, async (manager) => {
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
    });
  }

  private async window(companyId: string, now: Date): Promise<DayRange> {
    return this.context.run(companyId, async (manager) => {
      const { settings } = await this.companies.document(manager);
      const range = windowAround(now, settings.timeZone);
      await this.tellOnce(manager, companyId, range);
      return range;
    });
  }

  private async tellOnce(manager: EntityManager, companyId: string, range: DayRange): Promise<void> {
    if (this.told.get(companyId) === range.to) return;
    await tellEntering(manager, this.feed, range);
    this.told.set(companyId, range.to);
  }
}
