import { HttpException } from '@nestjs/common';
import type { ProblemCode, ProblemDetails } from '@rimeward/contracts';

const statuses: Record<ProblemCode, number> = {
  'bad-request': 400,
  'validation-failed': 422,
  'not-signed-in': 401,
  'session-ended': 401,
  'sign-in-failed': 401,
  'too-many-attempts': 429,
  'not-allowed': 403,
  'not-found': 404,
  conflict: 409,
  'changed-since-opened': 409,
  'wrong-step': 409,
  'payload-too-large': 413,
  'wrong-media-type': 415,
  'foreign-origin': 403,
  'device-unknown': 401,
  'device-revoked': 403,
  'photo-hash-mismatch': 422,
  'photo-type-refused': 415,
  'photo-too-large': 413,
  'photo-empty': 422,
  'storage-full': 507,
  'too-many-requests': 429,
  unavailable: 503,
  internal: 500,
};

export interface ProblemInfo {
  /** For the reader of the log and the answer; never holds another company's values. */
  detail?: string;
  fields?: { path: string; fault: string }[];
  retryAfterSeconds?: number;
}

/** An answer of the API that is not a success: a code that the web app has words for, as RFC 9457 problem details. */
export class ProblemException extends HttpException {
  constructor(
    readonly code: ProblemCode,
    readonly info: ProblemInfo = {},
  ) {
    super(code, statuses[code]);
  }

  details(): ProblemDetails {
    return {
      type: `urn:rimeward:problem:${this.code}`,
      title: this.code.replaceAll('-', ' '),
      status: this.getStatus(),
      code: this.code,
      ...this.info,
    };
  }
}
