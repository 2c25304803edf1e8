import type { StuckReason } from '@rimeward/delivery';
import { database } from '../database/database';
import { activeEnrolment } from '../device/enrolment';
import { unsentWork } from '../device/sign-out';
import { chainMarks } from './chain-marks';
import { readProgress } from './progress';

/** Where one item stands, in the words that the screens translate. */
export type Standing = 'on-this-phone' | 'on-its-way' | 'with-the-office' | 'held';

export interface DeliveryStatus {
  /** `stopped`: nobody is active. */
  phase: 'idle' | 'sending' | 'waiting' | 'stopped';
  /** Why the last round left something here; null when it did not. */
  reason: StuckReason | null;
  lastContactMs: number | null;
  nextTryMs: number | null;
  pendingEntries: number;
  pendingPhotos: number;
  pendingBytes: number;
  /** When the oldest unsent entry was saved. */
  oldestPendingMs: number | null;
  held: number;
}

/** How delivery stands, for a live query. */
export async function deliveryStatus(): Promise<DeliveryStatus> {
  const enrolment = await activeEnrolment();
  const [work, progress] = await Promise.all([unsentWork(), readProgress()]);
  const own = enrolment !== null && progress?.device === enrolment.deviceId ? progress : null;
  const pending = work.entries + work.photos > 0;
  return {
    phase: phaseOf(enrolment !== null, own?.phase ?? 'waiting', pending),
    reason: own?.reason ?? null,
    lastContactMs: own?.lastContactMs ?? null,
    nextTryMs: own?.nextTryMs ?? null,
    pendingEntries: work.entries,
    pendingPhotos: work.photos,
    pendingBytes: work.bytes,
    oldestPendingMs: enrolment === null ? null : await oldestPendingMs(enrolment.deviceId),
    held: work.held,
  };
}

function phaseOf(active: boolean, phase: 'sending' | 'waiting', pending: boolean): DeliveryStatus['phase'] {
  if (!active) return 'stopped';
  if (!pending) return 'idle';
  return phase;
}

async function oldestPendingMs(device: string): Promise<number | null> {
  const { head, acknowledged } = await chainMarks(database(), device);
  if (head.seq <= acknowledged.seq) return null;
  const oldest = await database().entries.get([device, acknowledged.seq + 1]);
  return oldest?.savedMs ?? null;
}
