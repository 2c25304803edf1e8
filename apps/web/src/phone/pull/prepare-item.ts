import type { CompanyDocument, FeedItem, Review } from '@rimeward/contracts';
import type { ReadEntryRow, ReadVisitRow } from '../database/schema';
import { sealText } from '../vault';
import { readLogEntry } from './read-log-entry';

/** A feed item as it will be stored: parsed, and with its secrets encrypted. */
export type PreparedItem =
  | { kind: 'company'; document: CompanyDocument }
  | { kind: 'visit'; row: ReadVisitRow; reviews: Review[] }
  | { kind: 'visit-removed'; id: string }
  | { kind: 'entry'; row: ReadEntryRow }
  | { kind: 'review'; review: Review }
  | { kind: 'unknown' };

export async function prepareItem(item: FeedItem, key: CryptoKey): Promise<PreparedItem> {
  switch (item.kind) {
    case 'company':
      return { kind: 'company', document: item.document };
    case 'visit': {
      const { accessNotes, gateCode } = item.document.site;
      const access =
        accessNotes === null && gateCode === null
          ? null
          : await sealText(key, JSON.stringify({ accessNotes, gateCode }));
      const site = { ...item.document.site, accessNotes: null, gateCode: null };
      const document = { ...item.document, site };
      return {
        kind: 'visit',
        row: { id: item.id, date: document.date, document, access },
        reviews: document.reviews,
      };
    }
    case 'visit-removed':
      return { kind: 'visit-removed', id: item.id };
    case 'entry':
      return { kind: 'entry', row: { ...item.entry, entry: readLogEntry(item.entry.text) } };
    case 'review':
      return { kind: 'review', review: item.review };
    default:
      return { kind: 'unknown' };
  }
}
