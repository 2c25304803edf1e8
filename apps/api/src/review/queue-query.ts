import { severities, visitStandings } from '@rimeward/contracts';
import { z } from 'zod';
import { ProblemException } from '../common/problem.exception';

const standingList = z
  .string()
  .transform((text) => text.split(','))
  .pipe(z.array(z.enum(visitStandings)).min(1));

/** Query of the review's queue; `standing` may name several, separated by commas. */
export const queueQuerySchema = z.object({
  date: z.iso.date().optional(),
  standing: standingList.optional(),
  severity: z.enum(severities).optional(),
  technician: z.uuid().optional(),
  q: z.string().trim().min(1).max(80).optional(),
  after: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type QueueQuery = z.infer<typeof queueQuerySchema>;

/** Last row of a page: the next begins behind it. */
export interface QueuePlace {
  rank: number;
  date: string;
  visitId: string;
}

const placeSchema = z.tuple([z.number().int(), z.iso.date(), z.uuid()]);

export function writePlace({ rank, date, visitId }: QueuePlace): string {
  return Buffer.from(JSON.stringify([rank, date, visitId])).toString('base64url');
}

/** @throws ProblemException `bad-request` for anything that we have not written ourselves */
export function readPlace(text: string): QueuePlace {
  let value: unknown;
  try {
    value = JSON.parse(Buffer.from(text, 'base64url').toString('utf8'));
  } catch {
    throw new ProblemException('bad-request', { fields: [{ path: 'after', fault: 'invalid' }] });
  }
  const place = placeSchema.safeParse(value);
  if (!place.success)
    throw new ProblemException('bad-request', { fields: [{ path: 'after', fault: 'invalid' }] });
  const [rank, date, visitId] = place.data;
  return { rank, date, visitId };
}
