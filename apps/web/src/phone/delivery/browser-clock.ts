import type { Clock, Timer } from '@rimeward/delivery';

/** Time and timers of the page. */
export const browserClock: Clock = {
  nowMs: () => Date.now(),
  timer: (ms): Timer => {
    let cancel = (): void => undefined;
    const done = new Promise<void>((resolve) => {
      const id = setTimeout(resolve, Math.max(0, ms));
      cancel = () => {
        clearTimeout(id);
        resolve();
      };
    });
    return { done, cancel: () => cancel() };
  },
};
