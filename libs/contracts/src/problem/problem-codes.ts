/**
 * Stable codes of the API's problem details (RFC 9457, member `code`). The web app has a text for each in both
 * languages; a missing one fails its build.
 */
export const problemCodes = [
  'bad-request',
  'validation-failed',
  'not-signed-in',
  'session-ended',
  'sign-in-failed',
  'too-many-attempts',
  'not-allowed',
  'not-found',
  'conflict',
  'changed-since-opened',
  'wrong-step',
  'payload-too-large',
  'wrong-media-type',
  'foreign-origin',
  'device-unknown',
  'device-revoked',
  'photo-hash-mismatch',
  'photo-type-refused',
  'photo-too-large',
  'photo-empty',
  'storage-full',
  'too-many-requests',
  'unavailable',
  'internal',
] as const;

export type ProblemCode = (typeof problemCodes)[number];
