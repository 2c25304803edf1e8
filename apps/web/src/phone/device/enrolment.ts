import type { Session } from '@rimeward/contracts';
import { database, type PhoneDatabase } from '../database/database';
import type { ActiveRow, Enrolment, Owner } from '../database/schema';

export type { Enrolment } from '../database/schema';

export const activeKey = 'active';

export function ownerOf(company: string, user: string): Owner {
  return `${company}/${user}`;
}

/** Who works with this phone now, with the settings last told by the office; null after sign-out or before enrolment. */
export async function activeEnrolment(db: PhoneDatabase = database()): Promise<Enrolment | null> {
  const active = await db.meta.get(activeKey);
  if (typeof active?.value !== 'string') return null;
  return (await db.devices.get(active.value)) ?? null;
}

/** Makes the person of this enrolment the active one. */
export async function setActive(db: PhoneDatabase, { deviceId, owner }: Enrolment): Promise<void> {
  const row: ActiveRow = { key: activeKey, value: deviceId, owner };
  await db.meta.put(row);
}

/** Takes newer names, role, language and settings from a session of the person who is active; any other is ignored. */
export async function rememberSession(session: Session, db: PhoneDatabase = database()): Promise<void> {
  const enrolment = await activeEnrolment(db);
  if (enrolment?.owner !== ownerOf(session.company.id, session.user.id)) return;
  await db.devices.update(enrolment.deviceId, { user: session.user, company: session.company });
}
