import { z } from 'zod';

/** Kinds of backflow assembly; `none` and `unknown` are answers too. */
export const backflowKinds = ['PVB', 'SVB', 'DCVA', 'RPA', 'AVB', 'none', 'unknown'] as const;
export type BackflowKind = (typeof backflowKinds)[number];

/** A valve that is turned by hand and recorded one by one: a shutoff, a test cock, a vent screw. */
export const handValveSchema = z.strictObject({
  id: z.string().min(1).max(40),
  role: z.enum(['shutoff', 'test-cock', 'vent-screw']),
  /** Number in the direction of flow, as the field-test procedures count them. */
  number: z.number().int().min(1).max(9),
});
export type HandValve = z.infer<typeof handValveSchema>;

export const backflowAssemblySchema = z.strictObject({
  kind: z.enum(backflowKinds),
  place: z.string().max(200),
  sizeIn: z.number().positive().max(12).nullable(),
  /** Maximum working pressure read on the assembly, psi. */
  ratedPsi: z.number().positive().max(1_000).nullable(),
  valves: z.array(handValveSchema).max(12),
});
export type BackflowAssembly = z.infer<typeof backflowAssemblySchema>;

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
