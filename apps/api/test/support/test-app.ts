import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import { generateKeyPairSync } from 'node:crypto';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { AppModule } from '../../src/app.module';
import { ENVIRONMENT } from '../../src/config/config.module';
import { readEnvironment } from '../../src/config/environment';
import { configureApp } from '../../src/configure-app';
import { createTestDatabase, type TestDatabase } from './database';

export interface TestApp {
  app: NestExpressApplication;
  database: TestDatabase;
  /** Address of the running server, for real HTTP. */
  url: string;
  photoDir: string;
  close: () => Promise<void>;
}

export const publicOrigin = 'http://127.0.0.1:4180';

/** The real application on a free port, against a fresh copy of the migrated database or against the one that is given. */
export async function createTestApp(
  environment: Record<string, string> = {},
  given?: TestDatabase,
): Promise<TestApp> {
  const database = given ?? (await createTestDatabase());
  const folder = mkdtempSync(join(tmpdir(), 'rimeward-app-'));
  const source = { ...environmentIn(folder, database), ...environment };
  const module = await Test.createTestingModule({ imports: [AppModule] })
    .overrideProvider(ENVIRONMENT)
    .useValue(readEnvironment(source))
    .compile();
  const app = module.createNestApplication<NestExpressApplication>({ logger: false, bodyParser: false });
  configureApp(app);
  await app.listen(0, '127.0.0.1');
  return {
    app,
    database,
    url: await app.getUrl(),
    photoDir: source.PHOTO_DIR,
    close: async () => {
      await app.close();
      if (!given) await database.drop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

/** Everything that the application asks of its environment, in a folder of its own. */
export function environmentIn(
  folder: string,
  database: Pick<TestDatabase, 'appUrl'>,
): Record<string, string> & { PHOTO_DIR: string } {
  const keyFile = join(folder, 'signing.pem');
  const { privateKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  writeFileSync(keyFile, privateKey.export({ type: 'pkcs8', format: 'pem' }));
  return {
    NODE_ENV: 'test',
    PORT: '0',
    HOST: '127.0.0.1',
    PUBLIC_ORIGIN: publicOrigin,
    DATABASE_URL: database.appUrl,
    PHOTO_DIR: join(folder, 'photos'),
    SESSION_JWT_SECRET: 'a secret for tests of at least 32 characters',
    SIGNING_KEY_FILE: keyFile,
    COOKIE_SECURE: 'true',
    LOG_LEVEL: 'silent',
  };
}
