import { z } from 'zod';
import { companySettingsSchema, languages, roles } from '../companies/settings';

/** POST /api/auth/sign-in */
export const signInRequestSchema = z.strictObject({
  email: z.email().max(254),
  password: z.string().min(1).max(256),
});
export type SignInRequest = z.infer<typeof signInRequestSchema>;

/** GET /api/auth/session, and the answer of sign-in and renew. Tokens travel in HttpOnly cookies only. */
export const sessionSchema = z.object({
  user: z.object({
    id: z.uuid(),
    name: z.string(),
    email: z.string(),
    role: z.enum(roles),
    language: z.enum(languages),
    blowOutSignedOff: z.boolean(),
  }),
  company: z.object({ id: z.uuid(), name: z.string(), settings: companySettingsSchema }),
  /** When the access cookie needs renewing and when the session ends whatever happens. */
  accessExpiresAt: z.iso.datetime(),
  sessionExpiresAt: z.iso.datetime(),
  serverTime: z.iso.datetime(),
});
export type Session = z.infer<typeof sessionSchema>;

/** PATCH /api/users/me */
export const updateMeRequestSchema = z.strictObject({ language: z.enum(languages) });

/** POST /api/devices: enrolment of this browser's storage; answered once with the ingest-only credential. */
export const enrolDeviceRequestSchema = z.strictObject({
  name: z.string().min(1).max(120),
  platform: z.string().max(200),
});
export const enrolDeviceResponseSchema = z.object({
  deviceId: z.uuid(),
  /** Sent as `Authorization: Device <deviceId>.<secret>`: may push this device's chain and photographs, read nothing. */
  ingestSecret: z.string(),
  lease: z.string(),
  /** Public key (JWK, ES256) that receipts and leases are signed with. */
  verifyKey: z.record(z.string(), z.unknown()),
});
export type EnrolDeviceResponse = z.infer<typeof enrolDeviceResponseSchema>;

/** POST /api/devices/:id/lease. A compact JWS (ES256) with the claims below; good for 72 h after the last contact. */
export const leaseResponseSchema = z.object({
  lease: z.string(),
  verifyKey: z.record(z.string(), z.unknown()),
});
export const leaseClaimsSchema = z.object({
  typ: z.literal('offline-lease'),
  sub: z.uuid(),
  company: z.uuid(),
  device: z.uuid(),
  iat: z.number().int(),
  exp: z.number().int(),
});
export type LeaseClaims = z.infer<typeof leaseClaimsSchema>;
