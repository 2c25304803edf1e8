import { DataSource } from 'typeorm';
import { dataSourceOptions } from './data-source';

/** Runs a command of operations at MIGRATION_DATABASE_URL, with the role that owns the tables; prints what it says. */
export function runAsMigrator(command: (dataSource: DataSource) => Promise<string>): void {
  const url = process.env['MIGRATION_DATABASE_URL'];
  connectAndRun(url, command).catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exitCode = 1;
  });
}

async function connectAndRun(
  url: string | undefined,
  command: (dataSource: DataSource) => Promise<string>,
): Promise<void> {
  if (!url) throw new Error('MIGRATION_DATABASE_URL is missing: the database with the migrator as user.');
  const dataSource = await new DataSource(dataSourceOptions(url)).initialize();
  try {
    console.log(await command(dataSource));
  } finally {
    await dataSource.destroy();
  }
}
