import { explain, type Explained } from '../explain/explanation';

/** Whether a compressor fits a zone. */
export type FitVerdict = 'suitable' | 'slow' | 'too-small';

/** Why, as a code that a screen translates, with the figures that go into the sentence. */
export interface FitReason {
  code:
    | 'small-shop-compressor'
    | 'cannot-lift'
    | 'half-the-air'
    | 'less-air-than-water'
    | 'heads-drop'
    | 'hose-holds-back'
    | 'enough';
  params: Readonly<Record<string, number>>;
}

/** The common-practice check: 80 to 100 ft3/min for mains up to 2 in. */
export interface PracticeCheck {
  standing: 'below' | 'within' | 'above' | 'not-covered';
  leastCfm: number;
  mostCfm: number;
}

/** A compressor against a zone. */
export interface CompressorFit extends Explained {
  verdict: FitVerdict;
  /** Worst first. */
  reasons: readonly FitReason[];
  practice: PracticeCheck;
}

/** Where the verdict turns; a company may set its own. */
export interface FitThresholds {
  /** Free air under which a compressor is refused: three horsepower at 4 ft3/min (common practice). */
  leastFreeAirCfm: number;
  /** Delivered over needed air under which it is too small. */
  tooSmallRatio: number;
  /** Pressure at dry heads under which pop-up heads drop (from memory). */
  headsStayUpPsi: number;
}

export const usualFitThresholds: FitThresholds = {
  leastFreeAirCfm: 12,
  tooSmallRatio: 0.5,
  headsStayUpPsi: 15,
};

/** What the verdict rests on. */
export interface FitInput {
  deliveredCfm: number;
  /** Free air that displaces the design flow at the plan's pressure. */
  neededCfm: number;
  planPsi: number;
  liftPsi: number;
  /** Pressure at the dry heads; null where the design pressure is not known. */
  headPsi: number | null;
  heldBy: 'compressor' | 'regulator' | null;
  /** Drip and bubblers do not pop up. */
  headsPopUp: boolean;
  /** Largest main, nominal in; null without a main line. */
  largestMainIn: number | null;
}

/**
 * Suitable, slow or too small, and why. Too small: a shop compressor, not enough pressure to lift the water over the highest head, or
 * less than half the air that the water asks for. Slow: less air than water asks for (air rides over the water), or dry heads that drop
 * (the published field test: heads that stay up show that the compressor is big enough).
 */
export function compressorFit(
  input: FitInput,
  thresholds: FitThresholds = usualFitThresholds,
): CompressorFit {
  const reasons = [...tooSmall(input, thresholds), ...slow(input, thresholds)];
  const first = reasons[0];
  const verdict = !first ? 'suitable' : isTooSmall(first) ? 'too-small' : 'slow';
  return {
    verdict,
    reasons: first
      ? reasons
      : [{ code: 'enough', params: { deliveredCfm: input.deliveredCfm, neededCfm: input.neededCfm } }],
    practice: practiceCheck(input.deliveredCfm, input.largestMainIn),
    why: explain(
      'compressor-fit',
      {
        deliveredCfm: input.deliveredCfm,
        neededCfm: input.neededCfm,
        planPsi: input.planPsi,
        liftPsi: input.liftPsi,
        headPsi: input.headPsi,
        headsPopUp: input.headsPopUp,
        largestMainIn: input.largestMainIn,
        leastFreeAirCfm: thresholds.leastFreeAirCfm,
        tooSmallRatio: thresholds.tooSmallRatio,
        headsStayUpPsi: thresholds.headsStayUpPsi,
      },
      [],
      input.headPsi === null ? ['designPressurePsi'] : [],
    ),
  };
}

const isTooSmall = ({ code }: FitReason): boolean =>
  code === 'small-shop-compressor' || code === 'cannot-lift' || code === 'half-the-air';

function tooSmall(input: FitInput, thresholds: FitThresholds): FitReason[] {
  const { deliveredCfm, neededCfm, liftPsi, planPsi } = input;
  const reasons: FitReason[] = [];
  if (deliveredCfm < thresholds.leastFreeAirCfm) {
    const params = { deliveredCfm, leastCfm: thresholds.leastFreeAirCfm };
    reasons.push({ code: 'small-shop-compressor', params });
  }
  if (liftPsi >= planPsi) reasons.push({ code: 'cannot-lift', params: { liftPsi, planPsi } });
  if (deliveredCfm < thresholds.tooSmallRatio * neededCfm) {
    reasons.push({ code: 'half-the-air', params: { deliveredCfm, neededCfm } });
  }
  return reasons;
}

function slow(input: FitInput, thresholds: FitThresholds): FitReason[] {
  const { deliveredCfm, neededCfm, headPsi, heldBy, headsPopUp } = input;
  const reasons: FitReason[] = [];
  if (deliveredCfm < neededCfm && deliveredCfm >= thresholds.tooSmallRatio * neededCfm) {
    reasons.push({ code: 'less-air-than-water', params: { deliveredCfm, neededCfm } });
  }
  if (headPsi !== null && headsPopUp && headPsi < thresholds.headsStayUpPsi) {
    const code = heldBy === 'regulator' ? 'hose-holds-back' : 'heads-drop';
    reasons.push({ code, params: { headPsi, leastPsi: thresholds.headsStayUpPsi } });
  }
  return reasons;
}

function practiceCheck(deliveredCfm: number, largestMainIn: number | null): PracticeCheck {
  const range = { leastCfm: 80, mostCfm: 100 };
  if (largestMainIn === null || largestMainIn > 2) return { standing: 'not-covered', ...range };
  if (deliveredCfm < range.leastCfm) return { standing: 'below', ...range };
  return { standing: deliveredCfm > range.mostCfm ? 'above' : 'within', ...range };
}
