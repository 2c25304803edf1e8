import { createHmac, timingSafeEqual } from 'node:crypto';

export interface RenewalClaim {
  sessionId: string;
  generation: number;
}

const shape = /^([0-9a-f-]{36})\.(\d{1,9})\.([A-Za-z0-9_-]{43})$/;

/**
 * The opaque token of one generation of a session: 256 bits that only the server can make. It is never stored; a lost answer
 * can be given again word for word, and a stolen copy of the database opens no session.
 */
export function makeRenewalToken(secret: string, { sessionId, generation }: RenewalClaim): string {
  return `${sessionId}.${generation}.${mac(secret, sessionId, generation)}`;
}

/** The claim of a token, or null when the server has not made it. */
export function readRenewalToken(secret: string, token: string): RenewalClaim | null {
  const [, sessionId, generation, given] = shape.exec(token) ?? [];
  if (!sessionId || !generation || !given) return null;
  const expected = mac(secret, sessionId, Number(generation));
  if (!timingSafeEqual(Buffer.from(given), Buffer.from(expected))) return null;
  return { sessionId, generation: Number(generation) };
}

/** The mark of a browser in which this person has signed in before. */
export function knownBrowserMark(secret: string, userId: string): string {
  return `${userId}.${createHmac('sha256', secret).update(`known browser ${userId}`).digest('base64url')}`;
}

function mac(secret: string, sessionId: string, generation: number): string {
  return createHmac('sha256', secret).update(`session ${sessionId} ${generation}`).digest('base64url');
}
