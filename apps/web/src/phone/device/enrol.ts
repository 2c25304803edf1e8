import type { Session } from '@rimeward/contracts';
import { clockKey } from '../clock/known-time';
import { database, type PhoneDatabase } from '../database/database';
import { databaseFault, type DatabaseFault } from '../database/faults';
import type { Enrolment } from '../database/schema';
import { jsonBody, type Fetcher } from '../session/api-fetch';
import { rawFetch } from '../session/raw-fetch';
import { forgetHead } from '../save/known-head';
import { activeEnrolment, ownerOf, setActive } from './enrolment';
import { renewLease } from './lease';
import { dropReadData } from './sign-out';

export type EnrolFault = 'unreachable' | 'not-signed-in' | 'refused' | DatabaseFault;

export type EnrolResult = { ok: true; device: Enrolment } | { ok: false; fault: EnrolFault };

/**
 * Makes this phone the signed-in person's, online, after each sign-in. The first time it enrols the browser's storage as
 * a device of its own; later it takes the device up again, with everything that was left unsent on it.
 */
export async function enterAs(session: Session, fetcher: Fetcher = fetch): Promise<EnrolResult> {
  try {
    return await enter(database(), session, fetcher);
  } catch (error) {
    const fault = databaseFault(error);
    if (fault === null) throw error;
    return { ok: false, fault };
  }
}

async function enter(db: PhoneDatabase, session: Session, fetcher: Fetcher): Promise<EnrolResult> {
  const owner = ownerOf(session.company.id, session.user.id);
  const before = await activeEnrolment(db);
  if (before !== null && before.owner !== owner) await dropReadData(db);
  const known = await newestDevice(db, owner);
  const device = known ?? (await enrol(session, fetcher));
  if (typeof device === 'string') return { ok: false, fault: device };
  const enrolment = { ...device, owner, user: session.user, company: session.company };
  forgetHead();
  await db.transaction('rw', db.devices, db.meta, async () => {
    await db.devices.put(enrolment);
    await setActive(db, enrolment);
    const nowMs = Date.parse(session.serverTime);
    const value = { offsetMs: nowMs - Date.now(), estimatedAtMs: Date.now(), latestSeenMs: nowMs };
    await db.meta.put({ key: clockKey, value });
  });
  if (known !== undefined) await renewLease(fetcher, db);
  return { ok: true, device: (await activeEnrolment(db)) ?? enrolment };
}

/** A fork or a revoked device is left behind by enrolling again: the newest one is the one in use. */
async function newestDevice(db: PhoneDatabase, owner: string): Promise<Enrolment | undefined> {
  const devices = await db.devices.where({ owner }).toArray();
  return devices.filter((device) => !device.leftBehind).sort((a, b) => b.enrolledMs - a.enrolledMs)[0];
}

async function enrol(session: Session, fetcher: Fetcher): Promise<Omit<Enrolment, 'owner'> | EnrolFault> {
  const platform = typeof navigator === 'undefined' ? 'unknown' : navigator.userAgent.slice(0, 200);
  const body = JSON.stringify({ name: `${session.user.name}`.slice(0, 120), platform });
  const response = await rawFetch('/api/devices', { method: 'POST', body }, fetcher);
  if (response === null || response.status >= 500) return 'unreachable';
  if (response.status === 401) return 'not-signed-in';
  if (!response.ok) return 'refused';
  const answer = await jsonBody(response);
  const { deviceId, ingestSecret, lease, verifyKey } = answer ?? {};
  if (typeof deviceId !== 'string' || typeof ingestSecret !== 'string') return 'unreachable';
  return {
    deviceId,
    ingestSecret,
    lease: typeof lease === 'string' ? lease : null,
    verifyKey: (verifyKey ?? {}) as Record<string, unknown>,
    user: session.user,
    company: session.company,
    enrolledMs: Date.now(),
  };
}

/**
 * Leaves the active device behind and enrols a new one: the way out of a fork or a revoked device. What is unsent
 * stays on the phone under the old device and goes to the office by export.
 */
export async function enrolAnew(session: Session, fetcher: Fetcher = fetch): Promise<EnrolResult> {
  const db = database();
  const before = await activeEnrolment(db);
  if (before !== null) await db.devices.update(before.deviceId, { leftBehind: true });
  return enterAs(session, fetcher);
}
