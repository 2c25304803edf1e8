import { z } from 'zod';

export const sha256HexSchema = z.string().regex(/^[0-9a-f]{64}$/);

/** What a photograph proves; the subject ties it to the part, valve or zone that it shows. */
export const photoRoles = [
  'sensitive-part',
  'backflow-valve',
  'damage-before-work',
  'defect',
  'air-connection',
  'drain',
  'site',
] as const;
export type PhotoRole = (typeof photoRoles)[number];

export const geoPointSchema = z.strictObject({
  latitude: z.number().min(-90).max(90),
  longitude: z.number().min(-180).max(180),
  accuracyM: z.number().min(0),
});
export type GeoPoint = z.infer<typeof geoPointSchema>;

export const photoReferenceSchema = z.strictObject({
  sha256: sha256HexSchema,
  bytes: z.number().int().positive(),
  type: z.string().max(60),
  role: z.enum(photoRoles),
  /** Position at the moment of capture, from the phone's own sensor; null when it was refused or unknown. */
  takenAt: geoPointSchema.nullable(),
  /** `camera` when the page or the file input took it now, `gallery` when it was chosen from stored pictures. */
  source: z.enum(['camera', 'gallery']),
});
export type PhotoReference = z.infer<typeof photoReferenceSchema>;

/** The clock as the phone told it. `offsetMs` is server minus phone, estimated `offsetAgeMs` before. */
export const entryTimeSchema = z.strictObject({
  wall: z.iso.datetime({ precision: 3 }),
  zone: z.string().min(1).max(60),
  offsetMs: z.number().int().nullable(),
  offsetAgeMs: z.number().int().min(0).nullable(),
});
export type EntryTime = z.infer<typeof entryTimeSchema>;

/**
 * Envelope version 1. The body is checked by its entry type in a second step, so that an entry of an unknown
 * type still has a readable envelope and can be held for a person.
 */
export const envelopeSchema = z.strictObject({
  v: z.literal(1),
  id: z.uuid(),
  device: z.uuid(),
  seq: z.number().int().min(1),
  /** Hash of the device's previous entry; 64 zeros for the first. */
  prev: sha256HexSchema,
  company: z.uuid(),
  actor: z.uuid(),
  visit: z.uuid(),
  type: z.string().min(1).max(60),
  typeVersion: z.number().int().min(1),
  body: z.record(z.string(), z.unknown()),
  photos: z.array(photoReferenceSchema).max(40),
  time: entryTimeSchema,
  app: z.string().max(40),
});
export type Envelope = z.infer<typeof envelopeSchema>;
