import { Injectable } from '@nestjs/common';
import { severities, type QueueItem, type QueueResponse } from '@rimeward/contracts';
import { CompanyContext } from '../database/company-context';
import { ProjectionService } from '../projection/projection.service';
import { readPlace, writePlace, type QueueQuery } from './queue-query';
import { companySetting as company } from '../database/protect-table';

const filterSql = `
  company_id = ${company}
  and ($1::date is null or visit_date = $1)
  and ($2::text[] is null or standing = any($2))
  and ($3::text is null or case $3 when 'danger' then danger when 'fault' then fault when 'gap' then gap else note end > 0)
  and ($4::uuid is null or $4 = any(technician_ids) or $4 = any(actor_ids))
  and ($5::text is null or position(lower($5) in lower(concat_ws(' ', site_name, town, crew_name, technicians::text))) > 0)`;

const pageSql = `
  select visit_id, visit_date::text as date, site_name, town, crew_name, technicians, standing, rank, danger, fault, gap, note,
    findings, cycles, zones_done, zones_total, held_entries, left_at, position,
    (select count(distinct r.sha256)::int from photo_references r
      where r.company_id = v.company_id and r.visit_id = v.visit_id) as photos,
    (select count(distinct r.sha256)::int from photo_references r
      where r.company_id = v.company_id and r.visit_id = v.visit_id and not exists (
        select from photos p where p.company_id = r.company_id and p.sha256 = r.sha256 and p.state = 'complete')
    ) as photos_missing
  from visit_projections v
  where ${filterSql}
    and ($6::integer is null or rank < $6 or (rank = $6 and (visit_date, visit_id) > ($7::date, $8::uuid)))
  order by rank desc, visit_date, visit_id limit $9`;

interface QueueRow {
  visit_id: string;
  date: string;
  site_name: string;
  town: string;
  crew_name: string | null;
  technicians: string[];
  standing: QueueItem['standing'];
  rank: number;
  danger: number;
  fault: number;
  gap: number;
  note: number;
  findings: QueueItem['worst'];
  cycles: number;
  zones_done: number;
  zones_total: number;
  held_entries: number;
  left_at: Date | null;
  position: string;
  photos: number;
  photos_missing: number;
}

/** The review's queue: worst first, then oldest. */
@Injectable()
export class QueueService {
  constructor(
    private readonly context: CompanyContext,
    private readonly projections: ProjectionService,
  ) {}

  async page(companyId: string, query: QueueQuery): Promise<QueueResponse> {
    await this.projections.freshen(companyId);
    const filter = [
      query.date ?? null,
      query.standing ?? null,
      query.severity ?? null,
      query.technician ?? null,
      query.q ?? null,
    ];
    const place = query.after === undefined ? null : readPlace(query.after);
    const from = [place?.rank ?? null, place?.date ?? null, place?.visitId ?? null, query.limit + 1];
    const { rows, total } = await this.context.run(companyId, async (manager) => {
      const found = await manager.query<QueueRow[]>(pageSql, [...filter, ...from]);
      const count = await manager.query<{ total: number }[]>(
        `select count(*)::int as total from visit_projections where ${filterSql}`,
        filter,
      );
      return { rows: found, total: count[0]?.total ?? 0 };
    });
    const page = rows.slice(0, query.limit);
    const last = rows.length > query.limit ? page.at(-1) : undefined;
    return {
      items: page.map(toItem),
      next: last ? writePlace({ rank: last.rank, date: last.date, visitId: last.visit_id }) : null,
      total,
    };
  }
}

function toItem(row: QueueRow): QueueItem {
  const { danger, fault, gap, note } = row;
  const worst = [...row.findings].sort(
    (one, other) => severities.indexOf(one.severity) - severities.indexOf(other.severity),
  );
  return {
    visitId: row.visit_id,
    date: row.date,
    siteName: row.site_name,
    town: row.town,
    crewName: row.crew_name,
    technicians: row.technicians,
    standing: row.standing,
    counts: { danger, fault, gap, note },
    worst: worst.slice(0, 3),
    cycles: row.cycles,
    zonesDone: row.zones_done,
    zonesTotal: row.zones_total,
    photos: row.photos,
    photosMissing: row.photos_missing,
    heldEntries: row.held_entries,
    leftAt: row.left_at?.toISOString() ?? null,
    position: Number(row.position),
  };
}
