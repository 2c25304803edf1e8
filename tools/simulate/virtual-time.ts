import type { Timer } from '@rimeward/delivery';

interface Due {
  atMs: number;
  order: number;
  fire: () => void;
}

/** Time that passes only when nothing is left to do: an hour of waiting costs nothing, and each run repeats exactly. */
export class VirtualTime {
  nowMs = 0;
  private order = 0;
  private due: Due[] = [];

  timer(ms: number): Timer {
    let settle = (): void => undefined;
    const done = new Promise<void>((resolve) => {
      settle = resolve;
    });
    const entry: Due = { atMs: this.nowMs + Math.max(0, ms), order: this.order, fire: settle };
    this.order += 1;
    this.due.push(entry);
    const cancel = (): void => {
      this.due = this.due.filter((other) => other !== entry);
      settle();
    };
    return { done, cancel };
  }

  sleep(ms: number): Promise<void> {
    return this.timer(ms).done;
  }

  /** Lets everything happen that is due until then. */
  async runUntil(untilMs: number): Promise<void> {
    for (;;) {
      await everythingSettled();
      const next = this.takeNext(untilMs);
      if (next === null) break;
      this.nowMs = next.atMs;
      next.fire();
    }
    this.nowMs = untilMs;
  }

  private takeNext(untilMs: number): Due | null {
    let first: Due | null = null;
    for (const entry of this.due) {
      if (entry.atMs > untilMs) continue;
      if (
        first === null ||
        entry.atMs < first.atMs ||
        (entry.atMs === first.atMs && entry.order < first.order)
      ) {
        first = entry;
      }
    }
    if (first !== null) this.due = this.due.filter((entry) => entry !== first);
    return first;
  }
}

/** All promises that can settle without time passing have settled. */
function everythingSettled(): Promise<void> {
  return new Promise((resolve) => setImmediate(resolve));
}
