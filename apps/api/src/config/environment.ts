import { existsSync } from 'node:fs';
import { z } from 'zod';

/** What the API reads from its environment, checked once at boot. The table of it stands in docs/operations.md. */
const environmentSchema = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
  HOST: z.string().min(1).default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(4180),
  PUBLIC_ORIGIN: z.url(),
  DATABASE_URL: z.url(),
  DATABASE_POOL: z.coerce.number().int().min(1).max(100).default(10),
  WEB_DIST_DIR: z.string().min(1).optional(),
  PHOTO_DIR: z.string().min(1),
  SESSION_JWT_SECRET: z.string().min(32),
  SIGNING_KEY_FILE: z.string().refine((path) => existsSync(path), 'names no file'),
  COOKIE_SECURE: z.enum(['true', 'false']).default('true'),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
});

export type Environment = z.infer<typeof environmentSchema>;

export class EnvironmentFault extends Error {}

/** @throws EnvironmentFault with one sentence for each variable that is missing or does not fit. */
export function readEnvironment(source: NodeJS.ProcessEnv = process.env): Environment {
  const read = environmentSchema.safeParse(source);
  if (read.success) return read.data;
  const sentences = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}.`);
  throw new EnvironmentFault(`The environment does not fit. ${sentences.join(' ')}`);
}
