import { z } from 'zod';
import { companySettingsSchema } from '../companies/settings';
import { reviewSchema } from '../review/decision';
import { visitDocumentSchema } from '../visits/visit-document';

/** An entry as it stands in the office: exact text, hash, and the reason when it is held for a person. */
export const storedEntrySchema = z.object({
  position: z.number().int(),
  device: z.uuid(),
  seq: z.number().int(),
  visitId: z.uuid().nullable(),
  text: z.string(),
  hash: z.string(),
  receivedAt: z.iso.datetime(),
  heldReason: z.string().nullable(),
});
export type StoredEntry = z.infer<typeof storedEntrySchema>;

export const compressorSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  freeAirCfm: z.number().positive(),
  maxPressurePsi: z.number().positive(),
  stages: z.union([z.literal(1), z.literal(2)]),
  aftercooler: z.boolean(),
});
export type Compressor = z.infer<typeof compressorSchema>;

export const hoseSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  insideDiameterIn: z.number().positive(),
  lengthFt: z.number().positive(),
  couplings: z.number().int().min(0),
});
export type Hose = z.infer<typeof hoseSchema>;

export const companyDocumentSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  settings: companySettingsSchema,
  compressors: z.array(compressorSchema),
  hoses: z.array(hoseSchema),
  people: z.array(z.object({ id: z.uuid(), name: z.string(), blowOutSignedOff: z.boolean() })),
});
export type CompanyDocument = z.infer<typeof companyDocumentSchema>;

export const feedItemSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('company'), document: companyDocumentSchema }),
  z.object({ kind: z.literal('visit'), id: z.uuid(), document: visitDocumentSchema }),
  z.object({ kind: z.literal('visit-removed'), id: z.uuid() }),
  z.object({ kind: z.literal('entry'), entry: storedEntrySchema }),
  z.object({ kind: z.literal('review'), review: reviewSchema }),
]);
export type FeedItem = z.infer<typeof feedItemSchema>;

/**
 * GET /api/sync/pull?epoch=&cursor=&limit= with a session. Positions are per company, in commit order, without gaps.
 * Another `epoch` than the one sent means that the office was restored: drop what was read and begin at 0.
 * `cursor` skips what the reader may not see, so it may advance further than the items show.
 */
export const pullResponseSchema = z.object({
  epoch: z.string(),
  cursor: z.number().int().min(0),
  more: z.boolean(),
  items: z.array(feedItemSchema),
  serverTime: z.iso.datetime(),
});
export type PullResponse = z.infer<typeof pullResponseSchema>;
