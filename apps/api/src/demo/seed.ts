import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import { dirname } from 'node:path';
import { AppModule } from '../app.module';
import { ENVIRONMENT } from '../config/config.module';
import { readEnvironment, type Environment } from '../config/environment';
import { seedDemo } from './seed-demo';

/** Fills the database at DATABASE_URL with the demo company and writes its accounts to DATA_DIR. */
async function seed(): Promise<void> {
  readEnvironment();
  const app = await NestFactory.createApplicationContext(AppModule, { logger: ['error', 'warn'] });
  try {
    const { PHOTO_DIR } = app.get<Environment>(ENVIRONMENT);
    await seedDemo(app, { now: new Date(), dataDir: process.env['DATA_DIR'] ?? dirname(PHOTO_DIR) });
  } finally {
    await app.close();
  }
}

seed().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
