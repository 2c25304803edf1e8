import { z } from 'zod';
import { sensitivePartKinds } from '../system/system';

/** A sensitive part was looked for. `partId` is one of the system's parts or a new id for a part found on site. */
export const partLookedForBody = z.strictObject({
  partId: z.uuid(),
  kind: z.enum(sensitivePartKinds),
  outcome: z.enum(['found', 'none', 'not-found']),
  note: z.string().max(1_000).optional(),
});

/** What was done so that air does not reach the part. */
export const partProtectedBody = z.strictObject({
  partId: z.uuid(),
  kind: z.enum(sensitivePartKinds),
  how: z.enum(['removed-blank', 'removed-spool', 'bypassed', 'left']),
  keptWhere: z.enum(['truck', 'controller', 'customer', 'on-site', 'nowhere']).nullable(),
  keptNote: z.string().max(200).optional(),
  reason: z.string().max(1_000).optional(),
});

/** Further photographs for something that has been recorded. `subject` is a part, valve, drain or zone id. */
export const photographsAddedBody = z.strictObject({
  subject: z.string().max(80).nullable(),
  caption: z.string().max(300).optional(),
});
