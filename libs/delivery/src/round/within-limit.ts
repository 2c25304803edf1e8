import type { Clock } from '../ports/clock';
import type { Sent } from '../ports/transport';

/** What the transport gets on top of its own limit before it is given up on. */
const graceMs = 2_000;

/**
 * Waits for a request no longer than its limit, whatever the transport does: a half-open socket, or a page that was
 * frozen and thawed, must not hold the queue. The answer of a request that was given up on is dropped.
 */
export async function withinLimit(
  clock: Clock,
  limitMs: number,
  send: (limitMs: number) => Promise<Sent>,
): Promise<Sent> {
  const timer = clock.timer(limitMs + graceMs);
  const late = timer.done.then((): Sent => ({ arrived: false, why: 'timeout' }));
  try {
    return await Promise.race([send(limitMs), late]);
  } finally {
    timer.cancel();
  }
}
