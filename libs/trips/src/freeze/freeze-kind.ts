/** Names the weather service gives a cold night by its lowest shelter temperature. */
export type FreezeKind = 'none' | 'frost' | 'freeze' | 'hard-freeze';

/** Highest temperature, F, of each kind as the weather service publishes them (nws-frost-freeze-maps). */
export const freezeKindLimitsF = { frost: 36, freeze: 32, hardFreeze: 28 } as const;

/** Hours ahead within which the weather service issues freeze warnings (nws-warning-criteria). */
export const warningWindowHours = { from: 12, to: 36 } as const;

/** Kind of a night whose lowest temperature is `lowF` (F, in the shelter at about 5 ft). */
export function freezeKind(lowF: number): FreezeKind {
  if (lowF <= freezeKindLimitsF.hardFreeze) return 'hard-freeze';
  if (lowF <= freezeKindLimitsF.freeze) return 'freeze';
  if (lowF <= freezeKindLimitsF.frost) return 'frost';
  return 'none';
}
