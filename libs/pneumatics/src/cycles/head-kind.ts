/** What waters a zone, by the words of the system record. */
export const headKinds = ['spray', 'rotor', 'rotary-nozzle', 'bubbler', 'drip', 'mixed', 'unknown'] as const;
export type HeadKind = (typeof headKinds)[number];

/** Longest air cycle by kind of head, s: gears and seals heat without water; drip has none (common practice). */
export const usualCycleCapSeconds: Readonly<Record<HeadKind, number>> = {
  spray: 120,
  rotor: 120,
  'rotary-nozzle': 120,
  bubbler: 120,
  drip: 180,
  mixed: 120,
  unknown: 120,
};

/** Whether heads of this kind pop up under pressure. */
export const popsUp = (kind: HeadKind): boolean => kind !== 'bubbler' && kind !== 'drip';
