import type { Session } from '@rimeward/contracts';
import { rememberSession } from '../device/enrolment';
import { rawFetch, type Fetcher } from './raw-fetch';

export type Renewal = { ok: true; session: Session } | { ok: false; fault: 'sign-in' | 'unreachable' };

let underWay: Promise<Renewal> | null = null;

/**
 * Renews the session, one request at a time in all tabs of this browser. `sign-in`: the office has ended the session;
 * everything unsent stays, and entries still leave with the device's own credential.
 */
export function renewSession(fetcher: Fetcher = fetch): Promise<Renewal> {
  underWay ??= alone(() => renew(fetcher)).finally(() => {
    underWay = null;
  });
  return underWay;
}

function alone(work: () => Promise<Renewal>): Promise<Renewal> {
  if (typeof navigator === 'undefined' || navigator.locks === undefined) return work();
  return navigator.locks.request('rimeward-renew', work);
}

async function renew(fetcher: Fetcher): Promise<Renewal> {
  const response = await rawFetch('/api/auth/renew', { method: 'POST', body: '{}' }, fetcher);
  if (response === null) return { ok: false, fault: 'unreachable' };
  if (response.status === 401 || response.status === 403) return { ok: false, fault: 'sign-in' };
  if (!response.ok) return { ok: false, fault: 'unreachable' };
  const session = await readSession(response);
  if (session === null) return { ok: false, fault: 'unreachable' };
  await rememberSession(session);
  return { ok: true, session };
}

async function readSession(response: Response): Promise<Session | null> {
  try {
    const value = (await response.json()) as Partial<Session> | null;
    return value?.user && value.company && value.sessionExpiresAt ? (value as Session) : null;
  } catch {
    return null;
  }
}
