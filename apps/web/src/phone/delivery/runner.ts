import { startLoop, type DeliveryLoop } from '@rimeward/delivery';
import { liveQuery } from 'dexie';
import { noteTimePassing } from '../clock/known-time';
import { codec } from '../codec';
import { database } from '../database/database';
import type { Enrolment } from '../database/schema';
import { activeEnrolment } from '../device/enrolment';
import { tidyDaily } from '../retention';
import { browserClock } from './browser-clock';
import { leadAlone } from './leader';
import { keepLeaseFresh } from './lease-keeper';
import { writeProgress } from './progress';
import { readReceipt } from './receipt';
import { deliveryStore } from './store';
import { httpTransport } from './transport';
import { onWake, wakeDelivery } from './wake';

/**
 * Starts delivering, for as long as the page lives, for whoever is active. Call it once at start; it follows sign-in and
 * sign-out by itself. Returns what stops it.
 */
export function startDelivery(): () => void {
  const leader = leadAlone(leadWhile);
  const offWindow = listenToWindow(() => void leader.takeOverIfFrozen());
  return () => {
    offWindow();
    leader.stop();
  };
}

/** Asks for a round now, whatever wait is under way; the button's function. */
export async function deliverNow(): Promise<void> {
  await noteTimePassing(Date.now());
  wakeDelivery('by-hand');
}

async function leadWhile(until: AbortSignal): Promise<void> {
  const running: { device: string | null; loop: DeliveryLoop | null } = { device: null, loop: null };
  const offWake = onWake((cause) => running.loop?.wake(cause));
  const follow = liveQuery(() => activeEnrolment()).subscribe({
    next: (enrolment) => {
      const device = enrolment?.deviceId ?? null;
      // A new name or lease of the same device needs no new loop.
      if (until.aborted || running.device === device) return;
      void running.loop?.stop();
      running.device = device;
      running.loop = enrolment === null ? null : deliverFor(enrolment);
    },
    error: noteFault,
  });
  await new Promise<void>((resolve) => {
    if (until.aborted) resolve();
    until.addEventListener('abort', () => resolve(), { once: true });
  });
  follow.unsubscribe();
  offWake();
  await running.loop?.stop();
}

function deliverFor(enrolment: Enrolment): DeliveryLoop {
  const db = database();
  const { deviceId, owner } = enrolment;
  return startLoop(
    {
      clock: browserClock,
      random: Math.random,
      codec,
      store: deliveryStore(db, deviceId, owner),
      transport: httpTransport(enrolment),
      readReceipt: async (receipt) => readReceipt(receipt, (await db.devices.get(deviceId)) ?? enrolment),
      noteFault,
    },
    async (status) => {
      await writeProgress(deviceId, status);
      if (status.phase === 'sending') return;
      await noteTimePassing(Date.now());
      await keepLeaseFresh(status.lastContactMs);
      await tidyDaily();
    },
  );
}

function noteFault(error: unknown): void {
  // The reason stands in the progress row; the console keeps the particulars.
  console.error('delivery', error);
}

function listenToWindow(onVisible: () => void): () => void {
  if (typeof document === 'undefined') return () => undefined;
  const online = (): void => wakeDelivery('online');
  const visible = (): void => {
    if (document.visibilityState !== 'visible') return;
    wakeDelivery('visible');
    onVisible();
  };
  window.addEventListener('online', online);
  document.addEventListener('visibilitychange', visible);
  return () => {
    window.removeEventListener('online', online);
    document.removeEventListener('visibilitychange', visible);
  };
}
