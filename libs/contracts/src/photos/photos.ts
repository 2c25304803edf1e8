import { z } from 'zod';

export const photoLimits = {
  /** Size of every part but the last. */
  partBytes: 256 * 1024,
  originalBytes: 40 * 1024 * 1024,
  previewBytes: 400 * 1024,
} as const;

export const photoTypes = ['image/jpeg', 'image/png', 'image/webp', 'image/heic'] as const;
export type PhotoType = (typeof photoTypes)[number];

const sha256 = z.string().regex(/^[0-9a-f]{64}$/);

/** POST /api/photos/announce with the device credential: which parts does the office lack? */
export const announceRequestSchema = z.strictObject({
  photos: z
    .array(z.strictObject({ sha256, bytes: z.number().int().min(1), type: z.enum(photoTypes) }))
    .min(1)
    .max(100),
});
export type AnnounceRequest = z.infer<typeof announceRequestSchema>;

export const photoStateSchema = z.object({
  sha256,
  state: z.enum(['complete', 'partial', 'refused']),
  missingParts: z.array(z.number().int().min(0)),
  hasPreview: z.boolean(),
  refusedBecause: z.string().optional(),
});
export const announceResponseSchema = z.object({ photos: z.array(photoStateSchema) });
export type AnnounceResponse = z.infer<typeof announceResponseSchema>;

/**
 * With the device credential, each repeatable at will, multipart/form-data with one file field, answered with `PhotoState`:
 * POST /api/photos/:sha256/parts/:n (field `part`, part n from 0) and POST /api/photos/:sha256/preview (field `preview`, JPEG).
 */
export const photoFields = { part: 'part', preview: 'preview' } as const;

/** POST /api/photos/:sha256/complete: the parts are joined, hashed, synced to disk and renamed; then it counts as proof. */
export type PhotoState = z.infer<typeof photoStateSchema>;

/** What the office knows of a photograph: facts read from the file are facts about the file, not proof of place. */
export const photoRecordSchema = z.object({
  sha256,
  bytes: z.number().int(),
  type: z.string(),
  complete: z.boolean(),
  hasPreview: z.boolean(),
  exif: z.record(z.string(), z.unknown()).nullable(),
  alsoOnVisits: z.array(z.uuid()),
});
export type PhotoRecord = z.infer<typeof photoRecordSchema>;
