import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { ReadEntry } from './read-entry';
import { companySetting as company } from '../../database/protect-table';

/** Most pairs of company and id that are remembered; a season of the largest company fits. */
const mostRemembered = 50_000;

/**
 * Tells which visits and people that a batch names are the company's own. Neither ever moves to another company, so what
 * was found once is remembered; what was not found is asked for again.
 */
@Injectable()
export class KnownReferences {
  private readonly visits = new Set<string>();
  private readonly actors = new Set<string>();

  async among(
    manager: EntityManager,
    companyId: string,
    batch: readonly ReadEntry[],
  ): Promise<{ visits: Set<string>; actors: Set<string> }> {
    const visits = unique(batch.map(({ visit }) => visit));
    const actors = unique(batch.map(({ actor }) => actor));
    const unknownVisits = visits.filter((id) => !this.visits.has(companyId + id));
    const unknownActors = actors.filter((id) => !this.actors.has(companyId + id));
    if (unknownVisits.length + unknownActors.length > 0) {
      const rows = await manager.query<{ kind: 'visit' | 'actor'; id: string }[]>(
        `select 'visit' as kind, id from visits where company_id = ${company} and id = any($1::uuid[])
         union all select 'actor', id from users where company_id = ${company} and id = any($2::uuid[])`,
        [unknownVisits, unknownActors],
      );
      for (const { kind, id } of rows) remember(kind === 'visit' ? this.visits : this.actors, companyId + id);
      const found = new Set(rows.map(({ kind, id }) => kind + id));
      return {
        visits: new Set(visits.filter((id) => !unknownVisits.includes(id) || found.has(`visit${id}`))),
        actors: new Set(actors.filter((id) => !unknownActors.includes(id) || found.has(`actor${id}`))),
      };
    }
    return { visits: new Set(visits), actors: new Set(actors) };
  }
}

function unique(ids: readonly (string | null)[]): string[] {
  return [...new Set(ids.filter((id) => id !== null))];
}

function remember(known: Set<string>, key: string): void {
  if (known.size >= mostRemembered) known.clear();
  known.add(key);
}
