import type { StuckReason } from '../answers/stuck-reason';
import type { DeliveryPorts } from '../ports/ports';
import { nextWaitMs } from '../retry/schedule';
import { runRound, type RoundReport } from '../round/round';
import { freshMemory } from '../round/step';
import { WakeSignal, type WakeCause } from './wake-signal';

export interface LoopStatus {
  phase: 'sending' | 'waiting';
  reason: StuckReason | null;
  /** When the next round begins by itself; null while one runs. */
  nextTryMs: number | null;
  /** Last time that the office answered in this loop's life. */
  lastContactMs: number | null;
}

export interface DeliveryLoop {
  wake: (cause: WakeCause) => void;
  /** Ends after the running round; nothing is cut off. */
  stop: () => Promise<void>;
}

/**
 * Runs rounds for ever. Whatever a round does, even throw, the next one is scheduled: a queue that sticks is the
 * likeliest fault left once loss is excluded.
 *
 * @param report told about every change; when it fails the fault is noted and the loop goes on
 */
export function startLoop(ports: DeliveryPorts, report: (status: LoopStatus) => Promise<void>): DeliveryLoop {
  const memory = freshMemory();
  const signal = new WakeSignal();
  let stopped = false;
  let failures = 0;
  let lastContactMs: number | null = null;

  const tell = async (status: Omit<LoopStatus, 'lastContactMs'>): Promise<void> => {
    try {
      await report({ ...status, lastContactMs });
    } catch (error) {
      ports.noteFault(error);
    }
  };

  // Measured by timers, never by the wall clock: a clock set back must not lengthen a wait.
  const wait = async (waitMs: number, askedMs: number): Promise<void> => {
    let over = false;
    let askedToWait = askedMs > 0;
    const whole = ports.clock.timer(waitMs);
    const asked = ports.clock.timer(askedMs);
    const wholeDone = whole.done.then(() => void (over = true));
    void asked.done.then(() => void (askedToWait = false));
    while (!stopped && !over && !signal.endsWait(failures, askedToWait)) {
      await Promise.race([wholeDone, signal.next()]);
    }
    whole.cancel();
    asked.cancel();
    if (signal.take().includes('by-hand')) memory.forked = false;
  };

  const run = async (): Promise<void> => {
    while (!stopped) {
      await tell({ phase: 'sending', reason: null, nextTryMs: null });
      const round = await guarded(ports, () => runRound(ports, memory));
      failures = round.reason === null ? 0 : round.progressed ? 1 : failures + 1;
      if (round.contact) lastContactMs = ports.clock.nowMs();
      const waitMs = nextWaitMs(failures, round.retryAfterMs, ports.random);
      await tell({ phase: 'waiting', reason: round.reason, nextTryMs: ports.clock.nowMs() + waitMs });
      await wait(waitMs, round.retryAfterMs ?? 0);
    }
  };

  const finished = run();
  return {
    wake: (cause) => signal.add(cause),
    stop: async () => {
      stopped = true;
      signal.interrupt();
      await finished;
    },
  };
}

/** A fault of the phone's own storage ends the round, not the delivery. */
async function guarded(ports: DeliveryPorts, round: () => Promise<RoundReport>): Promise<RoundReport> {
  try {
    return await round();
  } catch (error) {
    ports.noteFault(error);
    return { reason: 'phone-storage', retryAfterMs: null, progressed: false, contact: false };
  }
}
