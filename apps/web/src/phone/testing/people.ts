import type { Session } from '@rimeward/contracts';
import { database } from '../database/database';
import type { Enrolment } from '../database/schema';
import { forgetHead } from '../save/known-head';
import { ownerOf, setActive } from '../device/enrolment';

export const companyId = '018f6b2a-0000-7000-8000-00000000c001';
export const visitId = '018f6b2a-0000-7000-8000-00000000a001';

/** A session of a technician whose ids end in `n`. */
export function sessionOf(n: number): Session {
  return {
    user: {
      id: `018f6b2a-0000-7000-8000-00000000b00${n}`,
      name: `Technician ${n}`,
      email: `technician${n}@example.test`,
      role: 'technician',
      language: 'en',
      blowOutSignedOff: true,
    },
    company: {
      id: companyId,
      name: 'Test Company',
      settings: {
        units: 'us',
        metricPressure: 'kPa',
        language: 'en',
        timeZone: 'America/Denver',
        pressureCapPsi: null,
        forbidsWorkingAlone: false,
      },
    },
    accessExpiresAt: '2026-10-15T07:00:00.000Z',
    sessionExpiresAt: '2026-11-15T06:00:00.000Z',
    serverTime: '2026-10-15T06:00:00.000Z',
  };
}

/** Makes technician `n` the active person of this phone, on a device of his own. */
export async function enrolTechnician(n: number, device: Partial<Enrolment> = {}): Promise<Enrolment> {
  const { user, company } = sessionOf(n);
  const enrolment: Enrolment = {
    deviceId: `018f6b2a-0000-7000-8000-00000000d00${n}`,
    owner: ownerOf(company.id, user.id),
    ingestSecret: 'secret',
    verifyKey: {},
    lease: null,
    user,
    company,
    enrolledMs: Date.now(),
    ...device,
  };
  await database().devices.put(enrolment);
  forgetHead();
  await setActive(database(), enrolment);
  return enrolment;
}

/** A note of technician `n`, ready to be saved. */
export function noteOf(
  n: number,
  text: string,
  photos: NonNullable<import('../save/entry-draft').NewEntry['photos']> = [],
) {
  const { user, company } = sessionOf(n);
  return {
    visit: visitId,
    type: 'note-written' as const,
    body: { text },
    photos,
    actor: user.id,
    company: company.id,
  };
}
