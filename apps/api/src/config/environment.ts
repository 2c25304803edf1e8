import { createPrivateKey } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { z } from 'zod';

const levels = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'] as const;

const isOrigin = (value: string): boolean => URL.canParse(value) && new URL(value).origin === value;
const isPostgres = (value: string): boolean => /^postgres(ql)?:\/\//.test(value) && URL.canParse(value);

/** What the API reads from its environment, checked once at boot; each description ends the sentence of a fault. */
const environmentSchema = z.object({
  NODE_ENV: z
    .enum(['production', 'development', 'test'])
    .default('production')
    .describe('production, development or test'),
  HOST: z.string().min(1).default('127.0.0.1').describe('an address to listen on'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(4180).describe('a port from 0 to 65535'),
  PUBLIC_ORIGIN: z
    .string()
    .refine(isOrigin)
    .describe('the origin that browsers use, like https://log.example.com, without a path'),
  DATABASE_URL: z
    .string()
    .refine(isPostgres)
    .describe('the address of the database with rimeward_app as user: postgres://…'),
  DATABASE_POOL: z.coerce
    .number()
    .int()
    .min(1)
    .max(100)
    .default(10)
    .describe('a number of connections from 1 to 100'),
  WEB_DIST_DIR: z.string().min(1).optional().describe('the folder of the built web application'),
  PHOTO_DIR: z.string().min(1).describe('a folder for photographs'),
  SESSION_JWT_SECRET: z.string().min(32).describe('a secret of at least 32 characters'),
  SIGNING_KEY_FILE: z
    .string()
    .refine(holdsSigningKey)
    .describe('a file that holds a private key on the curve P-256 as PEM'),
  COOKIE_SECURE: z.enum(['true', 'false']).default('true').describe('true or false'),
  /** Requests of one person or phone within 10 s. */
  REQUEST_LIMIT: z.coerce
    .number()
    .int()
    .min(10)
    .default(2_000)
    .describe('a number of requests in ten seconds, 10 or more'),
  LOG_LEVEL: z
    .enum(levels)
    .default('info')
    .describe(`one of ${levels.join(', ')}`),
});

export type Environment = z.infer<typeof environmentSchema>;

export class EnvironmentFault extends Error {}

/** @throws EnvironmentFault with one sentence for each variable that is missing or does not fit; it never shows a value. */
export function readEnvironment(source: NodeJS.ProcessEnv = process.env): Environment {
  const read = environmentSchema.safeParse(source);
  if (read.success) return read.data;
  const names = [...new Set(read.error.issues.map(({ path }) => String(path[0])))];
  throw new EnvironmentFault(names.map((name) => sentenceOf(name, source[name])).join('\n'));
}

function sentenceOf(name: string, value: string | undefined): string {
  const field = environmentSchema.shape[name as keyof Environment];
  return `${name} ${value === undefined ? 'is missing' : 'does not fit'}: it must be ${field.description ?? 'set'}.`;
}

function holdsSigningKey(path: string): boolean {
  try {
    return createPrivateKey(readFileSync(path)).asymmetricKeyDetails?.namedCurve === 'prime256v1';
  } catch {
    // Not there, not readable or not a key: the sentence says what is wanted.
    return false;
  }
}
