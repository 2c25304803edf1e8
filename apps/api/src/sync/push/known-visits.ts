import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../../database/protect-table';
import type { ReadEntry } from './read-entry';

/** Most visits that are remembered; several seasons of the largest company fit. */
const mostRemembered = 50_000;

/**
 * Tells which visits that a batch names are the company's own. A visit never moves to another company, so what was found once
 * is remembered; what was not found is asked for again.
 */
@Injectable()
export class KnownVisits {
  private readonly remembered = new Set<string>();

  async among(
    manager: EntityManager,
    companyId: string,
    batch: readonly ReadEntry[],
  ): Promise<ReadonlySet<string>> {
    const named = [...new Set(batch.flatMap(({ visit }) => visit ?? []))];
    const found = new Set(named.filter((id) => this.remembered.has(companyId + id)));
    const others = named.filter((id) => !found.has(id));
    if (others.length === 0) return found;
    const rows = await manager.query<{ id: string }[]>(
      `select id from visits where company_id = ${company} and id = any($1::uuid[])`,
      [others],
    );
    if (this.remembered.size > mostRemembered) this.remembered.clear();
    for (const { id } of rows) {
      found.add(id);
      this.remembered.add(companyId + id);
    }
    return found;
  }
}
