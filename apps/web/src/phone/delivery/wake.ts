import type { WakeCause } from '@rimeward/delivery';

const channelName = 'rimeward-delivery';

type Listener = (cause: WakeCause) => void;
const listeners = new Set<Listener>();
let channel: BroadcastChannel | null = null;

function openChannel(): BroadcastChannel | null {
  if (channel === null && typeof BroadcastChannel !== 'undefined')
    channel = new BroadcastChannel(channelName);
  return channel;
}

/** Asks for a round, in this tab or in the one that leads. */
export function wakeDelivery(cause: WakeCause = 'saved'): void {
  listeners.forEach((listener) => listener(cause));
  openChannel()?.postMessage(cause);
}

/** Hears wake-ups of this tab and of others. */
export function onWake(listener: Listener): () => void {
  const fromOthers = (event: MessageEvent<WakeCause>): void => listener(event.data);
  listeners.add(listener);
  openChannel()?.addEventListener('message', fromOthers);
  return () => {
    listeners.delete(listener);
    channel?.removeEventListener('message', fromOthers);
  };
}
