import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import { generateKeyPairSync } from 'node:crypto';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTestDatabase, type TestDatabase } from './database';

export interface TestApp {
  app: NestExpressApplication;
  database: TestDatabase;
  /** Address of the running server, for real HTTP. */
  url: string;
  photoDir: string;
  close: () => Promise<void>;
}

/** The real application on a free port, against a fresh copy of the migrated database. */
export async function createTestApp(environment: Record<string, string> = {}): Promise<TestApp> {
  const database = await createTestDatabase();
  const folder = mkdtempSync(join(tmpdir(), 'rimeward-app-'));
  const keyFile = join(folder, 'signing.pem');
  const { privateKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  writeFileSync(keyFile, privateKey.export({ type: 'pkcs8', format: 'pem' }));
  const photoDir = join(folder, 'photos');
  Object.assign(process.env, {
    NODE_ENV: 'test',
    PORT: '0',
    HOST: '127.0.0.1',
    PUBLIC_ORIGIN: 'http://127.0.0.1:4180',
    DATABASE_URL: database.appUrl,
    PHOTO_DIR: photoDir,
    SESSION_JWT_SECRET: 'a secret for tests of at least 32 characters',
    SIGNING_KEY_FILE: keyFile,
    COOKIE_SECURE: 'true',
    LOG_LEVEL: 'silent',
    ...environment,
  });
  // Read only now: the modules look at the environment when they are built.
  const { AppModule } = await import('../../src/app.module');
  const { configureApp } = await import('../../src/configure-app');
  const module = await Test.createTestingModule({ imports: [AppModule] }).compile();
  const app = module.createNestApplication<NestExpressApplication>({ logger: false, bodyParser: false });
  configureApp(app);
  await app.listen(0, '127.0.0.1');
  return {
    app,
    database,
    url: await app.getUrl(),
    photoDir,
    close: async () => {
      await app.close();
      await database.drop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
