/**
 * The length of a cycle when the page lived through it. The steady clock stops while a phone sleeps, so it only counts
 * when it agrees with the wall clock; otherwise the two entries' times have to say it.
 */
export interface CycleMark {
  cycleId: string;
  steadyMs: number;
  wallMs: number;
}

/** How far the two clocks may differ before neither is trusted alone, ms. */
const toleranceMs = 1_500;

export function elapsedBySteadyClock(
  mark: CycleMark | null,
  cycleId: string,
  now: Omit<CycleMark, 'cycleId'>,
): number | null {
  if (!mark || mark.cycleId !== cycleId) return null;
  const steady = now.steadyMs - mark.steadyMs;
  const wall = now.wallMs - mark.wallMs;
  if (steady < 0 || Math.abs(steady - wall) > toleranceMs) return null;
  return Math.round(steady);
}
