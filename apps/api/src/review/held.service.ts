import { Injectable } from '@nestjs/common';
import type { HeldResponse } from '@rimeward/contracts';
import type { Principal } from '../auth/principal';
import { ProblemException } from '../common/problem.exception';
import { CompanyContext } from '../database/company-context';
import { ProjectionService } from '../projection/projection.service';
import { markStale } from '../sync/feed/feed.service';
import { logColumns, storedEntry, type LogRow } from '../sync/log/log-reader';
import { companySetting as company } from '../database/protect-table';

const heldSql = `
  select ${logColumns} from log_entries where company_id = ${company} and held_reason is not null
  union all
  select ${logColumns} from stray_entries where company_id = ${company}`;

type HeldRow = LogRow & {
  device_name: string | null;
  note: string | null;
  by_name: string | null;
  settled_at: Date | null;
};

/** Entries that a person has to look at. Settling one writes down who did what about it; the entry itself never changes. */
@Injectable()
export class HeldService {
  constructor(
    private readonly context: CompanyContext,
    private readonly projections: ProjectionService,
  ) {}

  /** Those that nobody has settled before the settled ones, each oldest first; 1,000 of them at most. */
  async list(companyId: string): Promise<HeldResponse> {
    const rows = await this.context.run(companyId, (manager) =>
      manager.query<HeldRow[]>(
        `select h.*, d.name as device_name, s.note, s.by_name, s.at as settled_at
         from (${heldSql}) h
         left join devices d on d.company_id = ${company} and d.id = h.device_id
         left join held_settlements s on s.company_id = ${company} and s.position = h.position
         order by s.at is not null, h.position limit 1000`,
      ),
    );
    return { entries: rows.map(toHeld) };
  }

  async settle(principal: Principal, id: string, note: string): Promise<void> {
    if (!/^\d{1,15}$/.test(id)) throw new ProblemException('not-found');
    await this.context.run(principal.companyId, async (manager) => {
      const [held] = await manager.query<{ visit_id: string | null }[]>(
        `select visit_id from (${heldSql}) h where position = $1`,
        [id],
      );
      if (held === undefined) throw new ProblemException('not-found');
      const written = await manager.query<{ position: string }[]>(
        `insert into held_settlements (company_id, position, note, by_user_id, by_name, at)
         values (${company}, $1, $2, $3, $4, clock_timestamp()) on conflict (company_id, position) do nothing returning position`,
        [id, note, principal.userId, principal.name],
      );
      if (written.length === 0) throw new ProblemException('changed-since-opened');
      if (held.visit_id !== null) await markStale(manager, [held.visit_id]);
    });
    this.projections.wake(principal.companyId);
  }
}

function toHeld(row: HeldRow): HeldResponse['entries'][number] {
  const { note, by_name: by, settled_at: at } = row;
  return {
    ...storedEntry(row),
    id: row.position,
    deviceName: row.device_name ?? '',
    settled: note === null || by === null || at === null ? null : { note, by, at: at.toISOString() },
  };
}
