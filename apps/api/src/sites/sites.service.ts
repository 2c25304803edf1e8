import { Injectable } from '@nestjs/common';
import type { SiteListItem, SiteListResponse, SiteRecord } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../database/protect-table';

export interface SiteQuery {
  /** Part of a site's name, address or customer. */
  q?: string | undefined;
  /** `next` of the page before. */
  after?: string | undefined;
  limit: number;
}

/** Null for a reader who sees every site; else only the sites of this person's visits are seen. */
type OnlyFor = string | null;

const mayRead = `($1::uuid is null or exists (
  select from visits v join visit_assignments a on a.company_id = v.company_id and a.visit_id = v.id
  where v.company_id = s.company_id and v.site_id = s.id and a.user_id = $1))`;

const listSql = `
  select s.id, s.name, s.address, s.town, k.name as "customerName",
    count(y.id)::int as systems, coalesce(sum(jsonb_array_length(y.description -> 'zones')), 0)::int as zones
  from sites s
    join customers k on k.company_id = s.company_id and k.id = s.customer_id
    left join systems y on y.company_id = s.company_id and y.site_id = s.id
  where s.company_id = ${company} and ${mayRead}
    and ($2 = '' or position(lower($2) in lower(s.name || ' ' || s.address || ' ' || k.name)) > 0)
    and ($3 = '' or (s.name, s.id) > ($3, $4::uuid))
  group by s.company_id, s.id, k.name
  order by s.name, s.id limit $5`;

const recordSql = `
  select jsonb_build_object('id', s.id, 'name', s.name, 'address', s.address, 'town', s.town,
      'latitude', s.latitude, 'longitude', s.longitude, 'elevationFt', s.elevation_ft,
      'accessNotes', s.access_notes, 'gateCode', s.gate_code) as site,
    jsonb_build_object('id', k.id, 'name', k.name, 'phone', k.phone) as customer,
    coalesce((select jsonb_agg(y.description order by y.description ->> 'name', y.id) from systems y
      where y.company_id = s.company_id and y.site_id = s.id), '[]'::jsonb) as systems
  from sites s join customers k on k.company_id = s.company_id and k.id = s.customer_id
  where s.company_id = ${company} and ${mayRead} and s.id = $2`;

/** What is known of the places that the company looks after. */
@Injectable()
export class SitesService {
  async list(manager: EntityManager, onlyFor: OnlyFor, query: SiteQuery): Promise<SiteListResponse> {
    const [afterName, afterId] = readPlace(query.after);
    const rows = await manager.query<SiteListItem[]>(listSql, [
      onlyFor,
      query.q?.trim() ?? '',
      afterName,
      afterId,
      query.limit + 1,
    ]);
    const sites = rows.slice(0, query.limit);
    const last = sites.at(-1);
    return { sites, next: rows.length > query.limit && last ? placeOf(last) : null };
  }

  async record(manager: EntityManager, onlyFor: OnlyFor, siteId: string): Promise<SiteRecord | null> {
    const [row] = await manager.query<SiteRecord[]>(recordSql, [onlyFor, siteId]);
    return row ?? null;
  }
}

function placeOf({ id, name }: SiteListItem): string {
  return Buffer.from(JSON.stringify([name, id])).toString('base64url');
}

const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** Name and id that a page begins after; a place that we have not made begins at the start. */
function readPlace(after: string | undefined): [string, string | null] {
  try {
    const place: unknown = JSON.parse(Buffer.from(after ?? '', 'base64url').toString('utf8'));
    if (!Array.isArray(place)) return ['', null];
    const [name, id] = place as unknown[];
    return typeof name === 'string' && typeof id === 'string' && uuid.test(id) ? [name, id] : ['', null];
  } catch {
    return ['', null];
  }
}
