import { correctedNow, readClock } from '../clock/known-time';
import { database, type PhoneDatabase } from '../database/database';
import type { Enrolment } from '../database/schema';
import { apiFetch, jsonBody, type Fetcher } from '../session/api-fetch';
import { activeEnrolment } from './enrolment';
import { readJws } from './jws';

/** Why customers' data is hidden. Recording goes on in each case, and nothing is wiped. */
export type LeaseFault = 'none' | 'expired' | 'clock-moved-back' | 'not-genuine' | 'other-device';

export type LeaseStanding = { good: true; untilMs: number } | { good: false; why: LeaseFault };

/** A clock may run this far behind the latest time seen before it counts as set back, ms. */
const clockToleranceMs = 5 * 60_000;

/** Whether customers' data may be shown now. */
export async function leaseStanding(
  db: PhoneDatabase = database(),
  wallMs = Date.now(),
): Promise<LeaseStanding> {
  const enrolment = await activeEnrolment(db);
  if (enrolment?.lease == null) return { good: false, why: 'none' };
  const clock = await readClock(db);
  return judgeLease(enrolment, enrolment.lease, correctedNow(clock, wallMs), clock.latestSeenMs);
}

async function judgeLease(
  enrolment: Enrolment,
  lease: string,
  nowMs: number,
  latestSeenMs: number,
): Promise<LeaseStanding> {
  const reading = await readJws(lease, enrolment.verifyKey);
  if (reading === null || !reading.genuine) return { good: false, why: 'not-genuine' };
  const { typ, sub, company, device, exp } = reading.claims;
  if (typ !== 'offline-lease' || typeof exp !== 'number') return { good: false, why: 'not-genuine' };
  if (device !== enrolment.deviceId || sub !== enrolment.user.id || company !== enrolment.company.id) {
    return { good: false, why: 'other-device' };
  }
  if (nowMs < latestSeenMs - clockToleranceMs) return { good: false, why: 'clock-moved-back' };
  if (nowMs >= exp * 1_000) return { good: false, why: 'expired' };
  return { good: true, untilMs: exp * 1_000 };
}

/** Fetches a fresh lease, and the signing key that goes with it; false when the office could not be asked. */
export async function renewLease(fetcher: Fetcher = fetch, db: PhoneDatabase = database()): Promise<boolean> {
  const enrolment = await activeEnrolment(db);
  if (enrolment === null) return false;
  const response = await apiFetch(
    `/api/devices/${enrolment.deviceId}/lease`,
    { method: 'POST', body: '{}' },
    fetcher,
  );
  const body = response?.ok ? await jsonBody(response) : null;
  if (body === null || typeof body['lease'] !== 'string') return false;
  const verifyKey = body['verifyKey'];
  if (typeof verifyKey !== 'object' || verifyKey === null) return false;
  await db.devices.update(enrolment.deviceId, {
    lease: body['lease'],
    verifyKey: verifyKey as Record<string, unknown>,
  });
  return true;
}

/** Why customers' data must be hidden now; null when it need not be. */
export async function leaseFault(db: PhoneDatabase = database()): Promise<LeaseFault | null> {
  const standing = await leaseStanding(db);
  return standing.good ? null : standing.why;
}
