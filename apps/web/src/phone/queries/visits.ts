import type { VisitDocument } from '@rimeward/contracts';
import { Dexie } from 'dexie';
import { database } from '../database/database';
import type { ReadVisitRow } from '../database/schema';
import { leaseFault, type LeaseFault } from '../device/lease';

/**
 * A visit as this phone may show it. `withheld`: the lease is no good, and customer, address and notes are blank; the
 * system stays, since the work goes on. Gate code and access notes are always null here, see `siteAccess`.
 */
export type PhoneVisit = VisitDocument & { withheld: LeaseFault | null };

/** Visits of one day (`2026-10-15`) in driving order. */
export async function visitsForDay(dateIso: string): Promise<PhoneVisit[]> {
  const rows = await database()
    .read_visits.where('[date+id]')
    .between([dateIso, Dexie.minKey], [dateIso, Dexie.maxKey])
    .toArray();
  const withheld = await leaseFault();
  return rows.map((row) => shown(row, withheld)).sort((a, b) => a.sequence - b.sequence);
}

/** Days that have visits, ascending. */
export async function visitDays(): Promise<string[]> {
  const keys = await database().read_visits.orderBy('[date+id]').keys();
  return [...new Set((keys as unknown as [string, string][]).map(([date]) => date))];
}

export async function visitDocument(id: string): Promise<PhoneVisit | null> {
  const row = await database().read_visits.get(id);
  return row === undefined ? null : shown(row, await leaseFault());
}

function shown({ document }: ReadVisitRow, withheld: LeaseFault | null): PhoneVisit {
  if (withheld === null) return { ...document, withheld };
  return {
    ...document,
    withheld,
    note: null,
    customer: { name: '', phone: null },
    site: { ...document.site, address: '', latitude: null, longitude: null },
    lastYear: null,
  };
}
