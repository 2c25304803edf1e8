import { announceRequestSchema, photoTypes, type AnnounceRequest } from '@rimeward/contracts';
import { z } from 'zod';
import { ProblemException } from '../common/problem.exception';

const outline = z.object({ photos: z.array(z.object({ bytes: z.unknown(), type: z.unknown() })) });

/**
 * Reads an announcement.
 *
 * @throws ProblemException `photo-empty` or `photo-type-refused` when that is what is wrong with it: the phone then sets that
 * photograph aside, where any other fault would make it try again
 */
export function readAnnouncement(body: unknown): AnnounceRequest {
  const request = announceRequestSchema.safeParse(body);
  if (request.success) return request.data;
  const photos = outline.safeParse(body).data?.photos ?? [];
  if (photos.some(({ bytes }) => bytes === 0)) throw new ProblemException('photo-empty');
  if (photos.some(({ type }) => !photoTypes.some((known) => known === type))) {
    throw new ProblemException('photo-type-refused');
  }
  throw new ProblemException('validation-failed', {
    fields: request.error.issues.map(({ path }) => ({ path: path.map(String).join('.'), fault: 'invalid' })),
  });
}
