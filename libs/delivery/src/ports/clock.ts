/** A wait that can be called off. `done` settles when the time is up or the wait was called off, never with an error. */
export interface Timer {
  done: Promise<void>;
  cancel: () => void;
}

/** Time as the host has it; virtual in the simulation. */
export interface Clock {
  /** Wall clock, ms since the epoch. */
  nowMs: () => number;
  timer: (ms: number) => Timer;
}

/** A number from 0 up to, not including, 1. */
export type Random = () => number;
