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
