import { Injectable } from '@nestjs/common';
import type { FeedItem, StoredEntry } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { CompanyDocumentsService } from '../../companies/company-documents.service';
import { reviewsById, reviewsOf } from '../../review/decision-rows';
import { VisitDocumentsService } from '../../visits/visit-documents.service';
import { earlierEntries, type FeedRow } from './feed-reader';

export interface FeedPage {
  /** Position that the reader had before; 0 for his first page. */
  after: number;
  visible: readonly string[];
  rows: readonly FeedRow[];
}

/** Turns rows of the feed into what they name; a document that is named often in a page goes once, where it is named last. */
@Injectable()
export class FeedItems {
  constructor(
    private readonly companies: CompanyDocumentsService,
    private readonly visits: VisitDocumentsService,
  ) {}

  async of(manager: EntityManager, page: FeedPage): Promise<FeedItem[]> {
    const first = page.after === 0;
    const named = unique(page.rows.flatMap((row) => (row.kind === 'visit' ? [row.id] : [])));
    const visits = await this.visitItems(manager, first ? page.visible : named);
    const reviews = await this.reviewItems(manager, page.rows);
    const company = first || page.rows.some(({ kind }) => kind === 'company');
    // On a first page the company and every visit come ahead, whether the feed has named them or not.
    const ahead = first ? [...visits.values()] : await this.entriesBefore(manager, page, named);
    const items = page.rows.flatMap((row, index): FeedItem[] => {
      if (row.kind === 'entry') return [{ kind: 'entry', entry: row.entry }];
      if (row.kind === 'company') return [];
      // Taken away and given back again: what he may see now rules.
      if (row.kind === 'visit-removed')
        return page.visible.includes(row.id) ? [] : [{ kind: row.kind, id: row.id }];
      const item = row.kind === 'review' ? reviews.get(row.id) : first ? undefined : visits.get(row.id);
      return item === undefined || isNamedLater(page.rows, index) ? [] : [item];
    });
    const head: FeedItem[] = company
      ? [{ kind: 'company', document: await this.companies.document(manager) }]
      : [];
    return [...head, ...ahead, ...items];
  }

  private async visitItems(manager: EntityManager, ids: readonly string[]): Promise<Map<string, FeedItem>> {
    if (ids.length === 0) return new Map();
    const documents = await this.visits.documents(manager, ids);
    const reviews = await reviewsOf(manager, ids);
    return new Map(
      documents.map((document) => {
        const own = reviews.filter(({ visitId }) => visitId === document.id);
        return [document.id, { kind: 'visit', id: document.id, document: { ...document, reviews: own } }];
      }),
    );
  }

  private async reviewItems(
    manager: EntityManager,
    rows: readonly FeedRow[],
  ): Promise<Map<string, FeedItem>> {
    const ids = unique(rows.flatMap((row) => (row.kind === 'review' ? [row.id] : [])));
    if (ids.length === 0) return new Map();
    const reviews = await reviewsById(manager, ids);
    return new Map(reviews.map((review) => [review.id, { kind: 'review', review }]));
  }

  /** Whoever is new on a visit has read past what was written there before; for the others it changes nothing. */
  private async entriesBefore(
    manager: EntityManager,
    page: FeedPage,
    visits: readonly string[],
  ): Promise<FeedItem[]> {
    if (visits.length === 0) return [];
    const entries = await earlierEntries(manager, visits, page.after);
    return entries.map((entry: StoredEntry) => ({ kind: 'entry', entry }));
  }
}

function unique(ids: readonly string[]): string[] {
  return [...new Set(ids)];
}

function isNamedLater(rows: readonly FeedRow[], index: number): boolean {
  const row = rows[index];
  return rows
    .slice(index + 1)
    .some((later) => later.kind === row?.kind && 'id' in later && 'id' in row && later.id === row.id);
}
