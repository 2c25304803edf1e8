import type { LoopStatus, StuckReason } from '@rimeward/delivery';
import { database } from '../database/database';

/** What the delivery last said about itself; one row, so that every tab and every screen sees the same. */
export interface DeliveryProgress {
  device: string;
  phase: LoopStatus['phase'];
  reason: StuckReason | null;
  nextTryMs: number | null;
  lastContactMs: number | null;
  /** When this was said: a leader that has been silent for long is frozen. */
  aliveMs: number;
}

const progressKey = 'delivery';

export async function readProgress(): Promise<DeliveryProgress | null> {
  const row = await database().meta.get(progressKey);
  return (row?.value as DeliveryProgress | undefined) ?? null;
}

export async function readAliveMs(): Promise<number | null> {
  return (await readProgress())?.aliveMs ?? null;
}

/** Keeps the last reason and contact while a new round runs: a screen must not flicker between rounds. */
export async function writeProgress(device: string, status: LoopStatus): Promise<void> {
  const before = await readProgress();
  const same = before?.device === device ? before : null;
  const value: DeliveryProgress = {
    device,
    phase: status.phase,
    reason: status.phase === 'sending' ? (same?.reason ?? null) : status.reason,
    nextTryMs: status.nextTryMs,
    lastContactMs: status.lastContactMs ?? same?.lastContactMs ?? null,
    aliveMs: Date.now(),
  };
  await database().meta.put({ key: progressKey, value });
}
