import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';

/** Whether the database answers and has every migration that this build knows. */
@Injectable()
export class DatabaseReadiness {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /** @throws whatever the driver throws when the database does not answer */
  async missingMigrations(): Promise<string[]> {
    const rows = await this.dataSource.query<{ name: string }[]>('select name from migrations');
    const run = new Set(rows.map(({ name }) => name));
    return this.dataSource.migrations.map(({ name }) => name ?? '').filter((name) => !run.has(name));
  }
}
