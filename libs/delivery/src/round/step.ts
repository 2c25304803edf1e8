import type { Failure } from '../answers/judge-answer';
import type { StuckReason } from '../answers/stuck-reason';

/** How a part of a round ended. `progressed`: something is now where it was not before. */
export interface StepResult {
  reason: StuckReason | null;
  retryAfterMs: number | null;
  progressed: boolean;
}

export function stepDone(progressed: boolean): StepResult {
  return { reason: null, retryAfterMs: null, progressed };
}

export function stepFailed(failure: Failure | StuckReason, progressed: boolean): StepResult {
  if (typeof failure === 'string') return { reason: failure, retryAfterMs: null, progressed };
  return { reason: failure.reason, retryAfterMs: failure.retryAfterMs, progressed };
}

/** What one delivery remembers from round to round; it may be lost at any time. */
export interface DeliveryMemory {
  /** Pushes that failed in a row: halves the batch. */
  pushFailures: number;
  /** A fork has been seen: nothing more is pushed until somebody asks for it by hand. */
  forked: boolean;
}

export const freshMemory = (): DeliveryMemory => ({ pushFailures: 0, forked: false });
