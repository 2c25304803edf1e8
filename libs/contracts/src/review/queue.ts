import { z } from 'zod';
import { manifestSchema } from '../sync/push';
import { storedEntrySchema } from '../sync/pull';
import { photoRecordSchema } from '../photos/photos';
import { visitDocumentSchema } from '../visits/visit-document';
import { reviewSchema } from './decision';

export const severities = ['danger', 'fault', 'gap', 'note'] as const;
export type Severity = (typeof severities)[number];

/** A finding as stored with the visit; the sentence in the reader's language is made from rule id and params. */
export const findingSchema = z.object({
  ruleId: z.string(),
  severity: z.enum(severities),
  entryIds: z.array(z.string()),
  params: z.record(z.string(), z.union([z.string(), z.number()])),
});

/** Where a visit stands for the review. */
export const visitStandings = [
  'planned',
  'under-way',
  'to-review',
  'sent-back',
  'answered',
  'accepted',
  'return-visit',
] as const;
export type VisitStanding = (typeof visitStandings)[number];

export const queueItemSchema = z.object({
  visitId: z.uuid(),
  date: z.iso.date(),
  siteName: z.string(),
  town: z.string(),
  crewName: z.string().nullable(),
  technicians: z.array(z.string()),
  standing: z.enum(visitStandings),
  counts: z.object({ danger: z.number(), fault: z.number(), gap: z.number(), note: z.number() }),
  worst: z.array(findingSchema).max(3),
  cycles: z.number().int(),
  zonesDone: z.number().int(),
  zonesTotal: z.number().int(),
  photos: z.number().int(),
  photosMissing: z.number().int(),
  heldEntries: z.number().int(),
  leftAt: z.iso.datetime().nullable(),
  position: z.number().int(),
});
export type QueueItem = z.infer<typeof queueItemSchema>;

/** GET /api/review/visits?date=&standing=&severity=&technician=&q=&after=&limit= : worst first, keyset pages. */
export const queueResponseSchema = z.object({
  items: z.array(queueItemSchema),
  next: z.string().nullable(),
  total: z.number().int(),
});
export type QueueResponse = z.infer<typeof queueResponseSchema>;

/** GET /api/review/visits/:id */
export const visitRecordSchema = z.object({
  visit: visitDocumentSchema,
  standing: z.enum(visitStandings),
  entries: z.array(storedEntrySchema),
  findings: z.array(findingSchema),
  rulesVersion: z.string(),
  photos: z.array(photoRecordSchema),
  reviews: z.array(reviewSchema),
  people: z.array(z.object({ id: z.uuid(), name: z.string() })),
  /** Newest position of the visit: sent back as `seenPosition` with a decision. */
  position: z.number().int(),
});
export type VisitRecord = z.infer<typeof visitRecordSchema>;

/** GET /api/review/devices: what is still on a phone, since when, how big. */
export const devicesResponseSchema = z.object({
  devices: z.array(
    z.object({
      id: z.uuid(),
      name: z.string(),
      userName: z.string(),
      revoked: z.boolean(),
      lastContactAt: z.iso.datetime().nullable(),
      acknowledgedThrough: z.number().int(),
      manifest: manifestSchema.nullable(),
    }),
  ),
});
export type DevicesResponse = z.infer<typeof devicesResponseSchema>;

/** GET /api/review/held: held entries, oldest first, with who settled them when somebody has. */
export const heldResponseSchema = z.object({
  entries: z.array(
    storedEntrySchema.extend({
      id: z.string(),
      deviceName: z.string(),
      settled: z.object({ note: z.string(), by: z.string(), at: z.iso.datetime() }).nullable(),
    }),
  ),
});
export type HeldResponse = z.infer<typeof heldResponseSchema>;

/** POST /api/review/held/:id/settle */
export const settleHeldRequestSchema = z.strictObject({ note: z.string().min(1).max(2_000) });
