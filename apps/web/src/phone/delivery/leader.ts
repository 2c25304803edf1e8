import { readAliveMs } from './progress';

const lockName = 'rimeward-delivery';
/** A leader that has not moved for so long is frozen: longer than the longest wait between two rounds and a request, ms. */
const frozenAfterMs = 4 * 60_000;

export interface Leadership {
  stop: () => void;
  /** Takes the lead from a tab that was frozen while it had it. */
  takeOverIfFrozen: () => Promise<void>;
}

/**
 * Runs `lead` in one tab at a time, until the signal that it is given. Without Web Locks every tab leads: the protocol
 * takes doubled requests, it only costs traffic.
 */
export function leadAlone(lead: (until: AbortSignal) => Promise<void>): Leadership {
  const stopping = new AbortController();
  if (typeof navigator === 'undefined' || navigator.locks === undefined) {
    void lead(stopping.signal);
    return { stop: () => stopping.abort(), takeOverIfFrozen: () => Promise.resolve() };
  }
  let leading = false;
  const ask = async (steal: boolean): Promise<void> => {
    const turn = new AbortController();
    const until = AbortSignal.any([stopping.signal, turn.signal]);
    const options: LockOptions = steal ? { steal: true } : { signal: stopping.signal };
    try {
      await navigator.locks.request(lockName, options, async () => {
        leading = true;
        await lead(until);
      });
    } catch (error) {
      // Called off before its turn, or taken over by another tab: both end this tab's lead and nothing else.
      if (!(error instanceof DOMException && error.name === 'AbortError')) throw error;
    } finally {
      turn.abort();
      leading = false;
    }
    // Taken over: stands in line again.
    if (!stopping.signal.aborted) await ask(false);
  };
  void ask(false);
  return {
    stop: () => stopping.abort(),
    takeOverIfFrozen: async () => {
      if (leading || stopping.signal.aborted) return;
      const aliveMs = await readAliveMs();
      if (aliveMs !== null && Date.now() - aliveMs > frozenAfterMs) void ask(true);
    },
  };
}
