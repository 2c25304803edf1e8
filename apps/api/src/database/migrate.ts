import { DataSource } from 'typeorm';
import { dataSourceOptions } from './data-source';

/** Brings the database at MIGRATION_DATABASE_URL to the newest migration. Run with the migrator's role. */
async function migrate(): Promise<void> {
  const url = process.env['MIGRATION_DATABASE_URL'];
  if (!url)
    throw new Error(
      'MIGRATION_DATABASE_URL is missing: the address of the database with the migrator as user.',
    );
  const dataSource = await new DataSource(dataSourceOptions(url)).initialize();
  try {
    const done = await dataSource.runMigrations();
    console.log(
      done.length === 0
        ? 'The database is current.'
        : `Migrations run: ${done.map((one) => one.name).join(', ')}.`,
    );
  } finally {
    await dataSource.destroy();
  }
}

migrate().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
