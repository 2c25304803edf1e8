import type { HeadKind } from '@rimeward/field-log';

/** Every figure that a rule compares with. A company may change one within `safeLimits`. Common practice unless said otherwise. */
export interface Thresholds {
  /** Air cycles that a zone needs. */
  cyclesPerZone: number;
  /** Longest air cycle by kind of head, s: about two minutes; drip has no gears to heat. */
  cycleCapSeconds: Readonly<Record<HeadKind, number>>;
  /** A thumb is late: a cycle counts as too long only this far past its cap, s. */
  cycleGraceSeconds: number;
  /** Air on for this long in one zone counts as left to itself, s. */
  unattendedSeconds: number;
  /** Rest of a zone between two of its cycles, s. */
  restSeconds: number;
  /** A reading counts as over the ceiling only this far past it, psi: half a division of a common gauge. */
  gaugeTolerancePsi: number;
  /** This many cycles, each at most `burstSeconds` long, look like a tank let go again and again. */
  burstCycles: number;
  burstSeconds: number;
  /** Air time under this share of the expected time is too little; over the other one it is too much. */
  tooLittleAir: number;
  tooMuchAir: number;
  /** A photograph further from the site than this, beyond its own accuracy, m. */
  photoDistanceM: number;
  /** A photograph older than its entry by more than this, h. */
  photoAgeHours: number;
  /** A clock that goes back, or an offset that jumps, by less than this is not spoken of, min. */
  clockMinutes: number;
  /** Entries before this moment cannot have been written with this product, ms since the epoch: 2024-01-01. */
  earliestMs: number;
  /** Two visits of one person may overlap by this much: clocks differ, min. */
  overlapMinutes: number;
}

export const defaultThresholds: Thresholds = {
  cyclesPerZone: 2,
  cycleCapSeconds: {
    spray: 120,
    rotor: 120,
    'rotary-nozzle': 120,
    bubbler: 120,
    drip: 180,
    mixed: 120,
    unknown: 120,
  },
  cycleGraceSeconds: 10,
  unattendedSeconds: 600,
  restSeconds: 60,
  gaugeTolerancePsi: 1,
  burstCycles: 3,
  burstSeconds: 12,
  tooLittleAir: 0.5,
  tooMuchAir: 6,
  photoDistanceM: 300,
  photoAgeHours: 12,
  clockMinutes: 3,
  earliestMs: Date.UTC(2024, 0, 1),
  overlapMinutes: 10,
};

/** What a company may change, and how far: never to fewer cycles, nor to a tolerance that hides a danger. */
export const safeLimits = {
  cyclesPerZone: [2, 6],
  cycleGraceSeconds: [0, 30],
  unattendedSeconds: [180, 900],
  restSeconds: [0, 600],
  gaugeTolerancePsi: [0, 2],
  tooLittleAir: [0.3, 0.9],
  tooMuchAir: [2, 20],
  photoDistanceM: [50, 2_000],
  photoAgeHours: [1, 72],
  clockMinutes: [1, 15],
  overlapMinutes: [0, 30],
} as const satisfies Partial<Record<keyof Thresholds, readonly [number, number]>>;

export type ThresholdChoices = Partial<Record<keyof typeof safeLimits, number>>;

/** The company's own thresholds; a choice outside the safe limits is drawn back to the nearest one inside. */
export function thresholdsOf(choices: ThresholdChoices | undefined): Thresholds {
  if (!choices) return defaultThresholds;
  const chosen: Thresholds = { ...defaultThresholds };
  for (const name of Object.keys(safeLimits) as (keyof typeof safeLimits)[]) {
    const value = choices[name];
    if (value === undefined || Number.isNaN(value)) continue;
    const [low, high] = safeLimits[name];
    chosen[name] = Math.min(high, Math.max(low, value));
  }
  return chosen;
}
