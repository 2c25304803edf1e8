import { needs, success, within, type Result } from '@rimeward/units';
import { explain, type Assumption, type Explained } from '../explain/explanation';
import { usualCycleCapSeconds, type HeadKind } from './head-kind';

/** Times the lower bound that mist is expected at: the middle of 1.5 to 2 (common practice), learned from past visits. */
export const usualTimeFactor = 1.75;
/** Rest between two cycles of a zone, s (common practice). */
export const usualRestSeconds = 60;
/** No cycle is proposed shorter than this, s. */
const shortestSeconds = 20;
const fewestCycles = 2;

/** Ideal displacement, s: water over flow. Source: worked out here (derived). */
export const displacementSeconds = (volumeGal: number, flowGpm: number): number => (volumeGal / flowGpm) * 60;

/** Proposed air cycles of a zone. */
export interface AirCycles extends Explained {
  /** Mist cannot come earlier, s. */
  leastSeconds: number;
  /** Mist is expected after so much air, s. */
  expectedSeconds: number;
  cycleCount: number;
  cycleSeconds: number;
  restSeconds: number;
  /** No cycle may be longer, s. */
  capSeconds: number;
  /** Cycles and rests together, s. */
  totalSeconds: number;
}

/** What the proposal depends on. */
export interface AirCyclesInput {
  volumeGal: number;
  /** Water that leaves in front of the air, gpm. */
  pushedGpm: number;
  headKind: HeadKind;
  /** Times the lower bound; 1 to 6. */
  timeFactor?: number;
  capSeconds?: number;
  restSeconds?: number;
}

/**
 * Number and length of air cycles: at least two, none over the cap of its heads, together as long as mist is expected to take. Needs
 * air that moves water (`pushedGpm` above 0). Sources: displacement (derived), factor and cycles (common practice).
 */
export function airCycles(input: AirCyclesInput): Result<AirCycles> {
  const { volumeGal, pushedGpm, headKind } = input;
  if (pushedGpm <= 0) return needs('pushedGpm');
  const factor = input.timeFactor ?? usualTimeFactor;
  const capSeconds = input.capSeconds ?? usualCycleCapSeconds[headKind];
  const restSeconds = input.restSeconds ?? usualRestSeconds;
  const impossible =
    within('volumeGal', volumeGal, 0, 100_000) ??
    within('pushedGpm', pushedGpm, 1e-6, 2_000) ??
    within('timeFactor', factor, 1, 6) ??
    within('capSeconds', capSeconds, shortestSeconds, 300) ??
    within('restSeconds', restSeconds, 0, 3_600);
  if (impossible) return impossible;
  const leastSeconds = displacementSeconds(volumeGal, pushedGpm);
  const expectedSeconds = leastSeconds * factor;
  const cycleCount = Math.max(fewestCycles, Math.ceil(expectedSeconds / capSeconds));
  const even = Math.ceil(expectedSeconds / cycleCount / 5) * 5;
  const cycleSeconds = Math.min(capSeconds, Math.max(shortestSeconds, even));
  return success({
    leastSeconds,
    expectedSeconds,
    cycleCount,
    cycleSeconds,
    restSeconds,
    capSeconds,
    totalSeconds: cycleCount * cycleSeconds + (cycleCount - 1) * restSeconds,
    why: explain(
      'air-cycles',
      { volumeGal, pushedGpm, headKind, timeFactor: factor, capSeconds, restSeconds },
      input.timeFactor === undefined ? usualFactor : [],
    ),
  });
}

const usualFactor: readonly Assumption[] = [
  { field: 'timeFactor', value: usualTimeFactor, why: 'time-factor' },
];
