import { sha256HexSchema } from '@rimeward/field-log';
import { ProblemException } from '../common/problem.exception';
import type { PhotoKey } from './storage/photo-storage';

/** Key of a photograph from an address; what is no hash names nothing, and never reaches a path. */
export function photoKey(companyId: string, sha256: string): PhotoKey {
  if (!sha256HexSchema.safeParse(sha256).success) throw new ProblemException('not-found');
  return { companyId, sha256 };
}
