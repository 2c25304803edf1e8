import type { BackflowKind, HandValve } from './backflow';

/**
 * The hand valves that an assembly of this kind carries.
 * Counts: PVB two shutoffs and two test cocks, DCVA and RPA two and four, SVB two, one and a vent screw
 * (plumbing code definitions and state field-test procedures, published); AVB none (from memory).
 */
export function handValvesOf(kind: BackflowKind): HandValve[] {
  const counts: Record<BackflowKind, { shutoffs: number; cocks: number; vents: number }> = {
    PVB: { shutoffs: 2, cocks: 2, vents: 0 },
    SVB: { shutoffs: 2, cocks: 1, vents: 1 },
    DCVA: { shutoffs: 2, cocks: 4, vents: 0 },
    RPA: { shutoffs: 2, cocks: 4, vents: 0 },
    AVB: { shutoffs: 0, cocks: 0, vents: 0 },
    none: { shutoffs: 0, cocks: 0, vents: 0 },
    unknown: { shutoffs: 0, cocks: 0, vents: 0 },
  };
  const { shutoffs, cocks, vents } = counts[kind];
  const make = (role: HandValve['role'], count: number): HandValve[] =>
    Array.from({ length: count }, (_, index) => ({ id: `${role}-${index + 1}`, role, number: index + 1 }));
  return [...make('shutoff', shutoffs), ...make('test-cock', cocks), ...make('vent-screw', vents)];
}
