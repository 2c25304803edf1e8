/** What asks for a round. By hand goes before any wait; the others respect a wait that the office asked for. */
export type WakeCause = 'saved' | 'online' | 'visible' | 'by-hand';

/** Collects wake-ups, those during a round too, until the wait takes them. */
export class WakeSignal {
  private causes: WakeCause[] = [];
  private ring: () => void = () => undefined;

  add(cause: WakeCause): void {
    this.causes.push(cause);
    this.ring();
  }

  /** Settles at the next wake-up or `interrupt`. */
  next(): Promise<void> {
    return new Promise((resolve) => {
      this.ring = resolve;
    });
  }

  interrupt(): void {
    this.ring();
  }

  /** Whether what has come so far ends a wait. A saved entry does not cut a back-off short. */
  endsWait(failures: number, askedToWait: boolean): boolean {
    return this.causes.some((cause) => {
      if (cause === 'by-hand') return true;
      return !askedToWait && (cause !== 'saved' || failures === 0);
    });
  }

  take(): WakeCause[] {
    const taken = this.causes;
    this.causes = [];
    return taken;
  }
}
