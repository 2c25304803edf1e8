import { leaseStanding, renewLease } from '../device/lease';

const leaseHours = 72;
const renewWhenOlderThanMs = 12 * 3_600_000;
const contactIsFreshMs = 2 * 60_000;

/** While the office answers: takes a new lease as soon as the present one is half a day old, or no good. */
export async function keepLeaseFresh(lastContactMs: number | null): Promise<void> {
  if (lastContactMs === null || Date.now() - lastContactMs > contactIsFreshMs) return;
  const standing = await leaseStanding();
  const ageMs = standing.good ? leaseHours * 3_600_000 - (standing.untilMs - Date.now()) : Infinity;
  if (ageMs > renewWhenOlderThanMs) await renewLease();
}
