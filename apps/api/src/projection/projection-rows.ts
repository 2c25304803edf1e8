import { severities } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { queueRank, type SeverityCounts } from '../review/queue-rank';
import type { Projection } from './summary';
import { companySetting as company } from '../database/protect-table';

const columns = [
  'visit_date',
  'site_name',
  'town',
  'crew_name',
  'technicians',
  'technician_ids',
  'standing',
  'rank',
  ...severities,
  'findings',
  'rules_version',
  'actor_ids',
  'cycles',
  'zones_done',
  'zones_total',
  'held_entries',
  'arrived_at',
  'left_at',
  'at_the_end',
  'position',
];

const saveSql = `
  insert into visit_projections (company_id, visit_id, ${columns.join(', ')})
  values (${company}, $1, ${columns.map((_, index) => `$${index + 2}`).join(', ')})
  on conflict (company_id, visit_id) do update set ${columns.map((name) => `${name} = excluded.${name}`).join(', ')}
  returning visit_id`;

export async function saveProjection(manager: EntityManager, projection: Projection): Promise<void> {
  const { document, findings } = projection;
  const counts = countBySeverity(findings);
  const rows = await manager.query<{ visit_id: string }[]>(saveSql, [
    document.id,
    document.date,
    document.site.name,
    document.site.town,
    document.crew?.name ?? null,
    document.assigned.map(({ name }) => name),
    document.assigned.map(({ userId }) => userId),
    projection.standing,
    queueRank(projection.standing, counts),
    ...severities.map((severity) => counts[severity]),
    JSON.stringify(findings),
    projection.rulesVersion,
    projection.actorIds,
    projection.cycles,
    projection.zonesDone,
    projection.zonesTotal,
    projection.heldEntries,
    projection.arrivedAt,
    projection.leftAt,
    projection.atTheEnd,
    projection.position,
  ]);
  if (rows.length !== 1) throw new Error('a projection was not written');
}

function countBySeverity(findings: Projection['findings']): SeverityCounts {
  const counts: SeverityCounts = { danger: 0, fault: 0, gap: 0, note: 0 };
  for (const { severity } of findings) counts[severity] += 1;
  return counts;
}
