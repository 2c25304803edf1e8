import { z } from 'zod';

/** What is still on the phone, told with every push so that the office knows even before the entries arrive. */
export const manifestSchema = z.strictObject({
  /** Sequence number of the newest entry on this device; 0 when there is none. */
  head: z.number().int().min(0),
  pendingEntries: z.number().int().min(0),
  pendingPhotos: z.number().int().min(0),
  pendingBytes: z.number().int().min(0),
  /** Wall clock of the oldest entry that has not been acknowledged. */
  oldestPendingWall: z.iso.datetime().nullable(),
  appVersion: z.string().max(40),
});
export type Manifest = z.infer<typeof manifestSchema>;

export const pushLimits = { entries: 100, bytes: 256 * 1024 } as const;

/**
 * POST /api/sync/push with the device credential. Each element of `entries` is the exact canonical JSON text of one
 * entry: its UTF-8 bytes are what is hashed, stored and compared.
 */
export const pushRequestSchema = z.strictObject({
  device: z.uuid(),
  manifest: manifestSchema,
  entries: z.array(z.string().max(64 * 1024)).max(pushLimits.entries),
});
export type PushRequest = z.infer<typeof pushRequestSchema>;

export const heldReasons = [
  'unreadable',
  'chain-broken',
  'fork',
  'unknown-type',
  'newer-version',
  'invalid-body',
  'device-revoked',
  'foreign-visit',
  'foreign-actor',
] as const;
export type HeldReason = (typeof heldReasons)[number];

export const pushResultSchema = z.object({
  seq: z.number().int(),
  result: z.enum(['stored', 'duplicate', 'held', 'gap']),
  heldReason: z.enum(heldReasons).optional(),
});

export const pushResponseSchema = z.object({
  /** Every entry up to and including this sequence number is committed in the office's database. */
  acknowledgedThrough: z.number().int().min(0),
  /** Hash of that entry; null when nothing has been stored yet. */
  acknowledgedHash: z.string().nullable(),
  results: z.array(pushResultSchema),
  serverTime: z.iso.datetime(),
  /** Compact JWS (ES256) over {typ:'receipt', device, company, acknowledgedThrough, hash, at}; null when nothing is stored. */
  receipt: z.string().nullable(),
  /** Photographs that stored entries name and the server does not have complete. */
  missingPhotos: z.array(z.string()),
});
export type PushResponse = z.infer<typeof pushResponseSchema>;
