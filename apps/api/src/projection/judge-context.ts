import type { CompanySettings, VisitDocument } from '@rimeward/contracts';
import type { VisitState } from '@rimeward/field-log';
import type { OtherStay, RuleContext } from '@rimeward/rules';
import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../database/protect-table';
import { takenMs } from './taken-ms';

interface ContextRow {
  settings: CompanySettings;
  elsewhere: Record<string, string[]> | null;
  exif: Record<string, Record<string, unknown>> | null;
  signed_off: Record<string, boolean> | null;
  stays: (Omit<OtherStay, 'fromMs' | 'toMs'> & { from: string; to: string })[] | null;
  broken: { device: string; seq: number; entryId: string }[] | null;
}

const contextSql = `
  select c.settings,
    (select jsonb_object_agg(sha256, visits) from (
       select mine.sha256, jsonb_agg(distinct other.visit_id) as visits
       from photo_references mine
       join photo_references other on other.company_id = mine.company_id and other.sha256 = mine.sha256
         and other.visit_id <> mine.visit_id
       where mine.company_id = c.id and mine.visit_id = $1 group by mine.sha256) e) as elsewhere,
    (select jsonb_object_agg(p.sha256, p.exif) from photos p
       where p.company_id = c.id and p.sha256 = any($2::text[]) and p.exif is not null) as exif,
    (select jsonb_object_agg(u.id, u.blow_out_signed_off) from users u
       where u.company_id = c.id and u.id = any($3::uuid[])) as signed_off,
    (select jsonb_agg(jsonb_build_object('visitId', v.visit_id, 'siteName', v.site_name, 'actor', actor,
         'from', v.arrived_at, 'to', v.left_at))
       from visit_projections v, unnest(v.actor_ids) as actor
       where v.company_id = c.id and v.visit_id <> $1 and actor = any($3::uuid[])
         and v.arrived_at <= $5::timestamptz and v.left_at >= $4::timestamptz) as stays,
    (select jsonb_agg(jsonb_build_object('device', l.device_id, 'seq', l.seq, 'entryId', l.entry_id) order by l.position)
       from log_entries l
       where l.company_id = c.id and l.visit_id = $1 and l.held_reason = 'chain-broken') as broken
  from companies c where c.id = ${company}`;

/** Everything that the rules want to know and the log of the visit alone cannot tell. */
export async function readContext(
  manager: EntityManager,
  document: VisitDocument,
  state: VisitState,
): Promise<RuleContext & { settings: CompanySettings }> {
  const times = state.entries.map(({ atMs }) => atMs).filter(isCalendarTime);
  const span = times.length === 0 ? [null, null] : [Math.min(...times), Math.max(...times)];
  const [row] = await manager.query<ContextRow[]>(contextSql, [
    document.id,
    state.photos.map(({ photo }) => photo.sha256),
    state.actors,
    ...span.map((ms) => (ms === null ? null : new Date(ms).toISOString())),
  ]);
  if (row === undefined) throw new Error('a visit without a company');
  const { latitude, longitude } = document.site;
  return {
    settings: row.settings,
    photosElsewhere: row.elsewhere ?? {},
    photoTakenMs: takenBySha(row.exif ?? {}, row.settings.timeZone),
    site: latitude === null || longitude === null ? null : { latitude, longitude },
    signedOff: row.signed_off ?? {},
    otherStays: (row.stays ?? []).map(({ from, to, ...stay }) => ({
      ...stay,
      fromMs: Date.parse(from),
      toMs: Date.parse(to),
    })),
    brokenChains: row.broken ?? [],
  };
}

function takenBySha(
  exif: Readonly<Record<string, Record<string, unknown>>>,
  timeZone: string,
): Record<string, number> {
  const taken = Object.entries(exif).map(([sha256, facts]) => [sha256, takenMs(facts, timeZone)] as const);
  return Object.fromEntries(taken.filter((one): one is [string, number] => one[1] !== null));
}

/** The database knows years 1 to 9999 in this form; a doubtful clock can name any other. */
function isCalendarTime(ms: number): boolean {
  return ms > -62_135_596_800_000 && ms < 253_402_300_800_000;
}
