import { z } from 'zod';

/** Pipe materials and wall classes that a system record may name. The physics library uses the same words. */
export const pipeMaterials = [
  'pvc-sch40',
  'pvc-sch80',
  'pvc-sdr13.5',
  'pvc-sdr21',
  'pvc-sdr26',
  'pvc-sdr32.5',
  'pe-sidr7',
  'pe-sidr9',
  'pe-sidr11.5',
  'pe-sidr15',
  'pe-sidr19',
  'copper-k',
  'copper-l',
  'copper-m',
  'galvanized',
  'unknown',
] as const;

export type PipeMaterial = (typeof pipeMaterials)[number];

/** One run of pipe of one material and one nominal size. `guessed` marks what nobody has dug up or measured. */
export const pipeRunSchema = z.strictObject({
  id: z.string().min(1).max(40),
  material: z.enum(pipeMaterials),
  nominalIn: z.number().positive().max(12),
  lengthFt: z.number().positive().max(20_000),
  ratedPsi: z.number().positive().max(2_000).nullable(),
  guessed: z.boolean(),
});

export type PipeRun = z.infer<typeof pipeRunSchema>;
