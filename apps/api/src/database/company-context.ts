import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { AsyncLocalStorage } from 'node:async_hooks';
import type { DataSource, EntityManager } from 'typeorm';

export type LookUp = { by: 'sign_in_email' | 'session' | 'device'; value: string };

/**
 * The only door to the database. Every piece of work runs in a short transaction that knows its company; row level security
 * shows it nothing else. Work inside work joins the transaction when the company is the same, and is refused otherwise.
 */
@Injectable()
export class CompanyContext {
  private readonly open = new AsyncLocalStorage<{ companyId: string; manager: EntityManager }>();

  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  run<T>(companyId: string, work: (manager: EntityManager) => Promise<T>): Promise<T> {
    if (!companyId) throw new Error('Work in the database needs a company');
    const outer = this.open.getStore();
    if (outer) {
      if (outer.companyId !== companyId) throw new Error('One transaction belongs to one company');
      return work(outer.manager);
    }
    return this.dataSource.transaction(async (manager) => {
      await manager.query("select set_config('app.company', $1, true)", [companyId]);
      return this.open.run({ companyId, manager }, () => work(manager));
    });
  }

  /** Reads the one row that the holder of this value may see before his company is known. */
  lookUp<T>({ by, value }: LookUp, work: (manager: EntityManager) => Promise<T>): Promise<T> {
    if (!value) throw new Error('A look-up needs a value');
    return this.dataSource.transaction(async (manager) => {
      await manager.query('select set_config($1, $2, true)', [`app.${by}`, value]);
      return work(manager);
    });
  }
}
