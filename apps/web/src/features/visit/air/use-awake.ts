import { useEffect } from 'react';

/** Keeps the screen on while `wanted`; a phone that cannot simply sleeps, and the times of the entries still hold. */
export function useAwake(wanted: boolean): void {
  useEffect(() => {
    if (!wanted || !('wakeLock' in navigator)) return;
    let lock: WakeLockSentinel | null = null;
    let alive = true;
    const ask = async (): Promise<void> => {
      if (document.visibilityState !== 'visible') return;
      try {
        const got = await navigator.wakeLock.request('screen');
        if (alive) lock = got;
        else await got.release();
      } catch (error) {
        // Refused on a low battery: the screen sleeps, nothing else changes.
        console.info('The screen cannot be kept on', error);
      }
    };
    const again = () => void ask();
    void ask();
    document.addEventListener('visibilitychange', again);
    return () => {
      alive = false;
      document.removeEventListener('visibilitychange', again);
      void lock?.release();
    };
  }, [wanted]);
}
