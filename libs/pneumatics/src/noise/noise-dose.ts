import { success, within, type Result } from '@rimeward/units';
import { explain, type Explained } from '../explain/explanation';

/** A stretch of the day at one sound level. */
export interface NoiseStretch {
  levelDba: number;
  hours: number;
}

/** Noise of a working day. */
export interface NoiseDose extends Explained {
  /** 100 % is the permissible exposure. */
  dosePercent: number;
  /** The steady level of eight hours that gives the same dose, dBA; null without any dose. */
  timeWeightedAverageDba: number | null;
  /** At or over half of the permissible exposure, where hearing conservation begins. */
  reachesActionLevel: boolean;
}

/** Hours that a level may last alone: T = 8 / 2^((L - 90) / 5). Source: 29 CFR 1910.95 App. A (published). */
export const permittedHours = (levelDba: number): number => 8 / 2 ** ((levelDba - 90) / 5);

/**
 * Noise dose of a day, D = 100 sum(C / T), and its time-weighted average. Levels 80 to 130 dBA count, lower ones do not; 0 to 24 h. Source:
 * 29 CFR 1910.95 App. A (published). A caution, not a statement of compliance.
 */
export function noiseDose(stretches: readonly NoiseStretch[]): Result<NoiseDose> {
  let dosePercent = 0;
  let hours = 0;
  for (const stretch of stretches) {
    const impossible = within('levelDba', stretch.levelDba, 0, 130) ?? within('hours', stretch.hours, 0, 24);
    if (impossible) return impossible;
    hours += stretch.hours;
    if (stretch.levelDba >= 80) dosePercent += (100 * stretch.hours) / permittedHours(stretch.levelDba);
  }
  const tooLong = within('hours', hours, 0, 24);
  if (tooLong) return tooLong;
  return success({
    dosePercent,
    timeWeightedAverageDba: dosePercent > 0 ? 16.61 * Math.log10(dosePercent / 100) + 90 : null,
    reachesActionLevel: dosePercent >= 50,
    why: explain('noise-dose', { stretches: stretches.length, hours }),
  });
}
