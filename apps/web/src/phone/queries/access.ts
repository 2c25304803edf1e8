import { database } from '../database/database';
import { activeEnrolment } from '../device/enrolment';
import { leaseFault, type LeaseFault } from '../device/lease';
import { openText } from '../vault';

export type SiteAccess = { accessNotes: string | null; gateCode: string | null } | { withheld: LeaseFault };

/** Gate code and access notes, decrypted for this moment; ask again instead of keeping them. */
export async function siteAccess(visitId: string): Promise<SiteAccess> {
  const withheld = await leaseFault();
  if (withheld !== null) return { withheld };
  const enrolment = await activeEnrolment();
  const [visit, key] = await Promise.all([
    database().read_visits.get(visitId),
    enrolment === null ? undefined : database().keys.get(enrolment.owner),
  ]);
  if (!visit?.access || key === undefined) return { accessNotes: null, gateCode: null };
  const text = await openText(key.key, visit.access);
  if (text === null) return { accessNotes: null, gateCode: null };
  return JSON.parse(text) as { accessNotes: string | null; gateCode: string | null };
}
