import { Injectable } from '@nestjs/common';
import type { VisitDocument } from '@rimeward/contracts';
import type { System } from '@rimeward/field-log';
import type { EntityManager } from 'typeorm';

interface Row {
  id: string;
  date: string;
  sequence: number;
  purpose: VisitDocument['purpose'];
  note: string | null;
  crew: VisitDocument['crew'];
  assigned: VisitDocument['assigned'];
  customer: VisitDocument['customer'];
  site: VisitDocument['site'];
  system: System;
  last_year: VisitDocument['lastYear'];
}

const documentsSql = `
  select v.id, v.date::text as date, v.sequence, v.purpose, v.note,
    case when c.id is null then null else jsonb_build_object('id', c.id, 'name', c.name) end as crew,
    coalesce((
      select jsonb_agg(jsonb_build_object('userId', u.id, 'name', u.name) order by u.name)
      from visit_assignments a join users u on u.company_id = a.company_id and u.id = a.user_id
      where a.company_id = v.company_id and a.visit_id = v.id), '[]'::jsonb) as assigned,
    jsonb_build_object('name', k.name, 'phone', k.phone) as customer,
    jsonb_build_object('id', s.id, 'name', s.name, 'address', s.address, 'town', s.town,
      'latitude', s.latitude, 'longitude', s.longitude, 'elevationFt', s.elevation_ft,
      'accessNotes', s.access_notes, 'gateCode', s.gate_code) as site,
    y.description as system,
    (select jsonb_build_object('date', p.date::text, 'technicians', p.technicians, 'notes', p.notes,
        'partsTakenOut', p.parts_taken_out)
      from visit_summaries p
      where p.company_id = v.company_id and p.system_id = v.system_id and p.date < v.date
      order by p.date desc limit 1) as last_year
  from visits v
    join sites s on s.company_id = v.company_id and s.id = v.site_id
    join customers k on k.company_id = s.company_id and k.id = s.customer_id
    join systems y on y.company_id = v.company_id and y.id = v.system_id
    left join crews c on c.company_id = v.company_id and c.id = v.crew_id
  where v.company_id = nullif(current_setting('app.company', true), '')::uuid and v.id = any($1::uuid[])
  order by v.date, v.sequence, v.id`;

/** Everything that a phone or a reviewer needs of a visit, in one document. Reviews are added by their own module. */
@Injectable()
export class VisitDocumentsService {
  async documents(manager: EntityManager, ids: readonly string[]): Promise<VisitDocument[]> {
    if (ids.length === 0) return [];
    const rows = await manager.query<Row[]>(documentsSql, [ids]);
    return rows.map(({ last_year: lastYear, ...row }) => ({ ...row, lastYear, reviews: [] }));
  }

  /** Ids of the visits that a person is assigned to, within a range of days where one is given. */
  async assignedTo(
    manager: EntityManager,
    userId: string,
    from: string | null,
    to: string | null,
  ): Promise<string[]> {
    const rows = await manager.query<{ id: string }[]>(
      `select v.id from visit_assignments a join visits v on v.company_id = a.company_id and v.id = a.visit_id
       where a.company_id = nullif(current_setting('app.company', true), '')::uuid and a.user_id = $1
         and ($2::date is null or v.date >= $2::date) and ($3::date is null or v.date <= $3::date)
       order by v.date, v.sequence, v.id`,
      [userId, from, to],
    );
    return rows.map(({ id }) => id);
  }
}
