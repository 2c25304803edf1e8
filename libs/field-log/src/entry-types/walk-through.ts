import { z } from 'zod';
import { keepingPlaces, partOutcomes, partProtections, sensitivePartKinds } from '../words/words';

/** A sensitive part was looked for. `partId` is one of the system's parts or a new id for a part found on site. */
export const partLookedForBody = z.strictObject({
  partId: z.uuid(),
  kind: z.enum(sensitivePartKinds),
  outcome: z.enum(partOutcomes),
  note: z.string().max(1_000).optional(),
});

/** What was done so that air does not reach the part. */
export const partProtectedBody = z.strictObject({
  partId: z.uuid(),
  kind: z.enum(sensitivePartKinds),
  how: z.enum(partProtections),
  keptWhere: z.enum(keepingPlaces).nullable(),
  keptNote: z.string().max(200).optional(),
  reason: z.string().max(1_000).optional(),
});

/**
 * Further photographs for something that has been recorded. `subject` is the id of a part, valve, drain, pump or zone,
 * or of the entry that told of damage or a defect.
 */
export const photographsAddedBody = z.strictObject({
  subject: z.string().max(80).nullable(),
  caption: z.string().max(300).optional(),
});
