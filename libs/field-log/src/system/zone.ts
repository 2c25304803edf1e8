import { z } from 'zod';
import { pipeRunSchema } from './pipe-run';

export const headKinds = ['spray', 'rotor', 'rotary-nozzle', 'bubbler', 'drip', 'mixed', 'unknown'] as const;
export type HeadKind = (typeof headKinds)[number];

/** What one control valve waters. Unknown figures are null, never guessed in silence. */
export const zoneSchema = z.strictObject({
  id: z.uuid(),
  number: z.number().int().min(1).max(200),
  name: z.string().max(120),
  headKind: z.enum(headKinds),
  headCount: z.number().int().min(0).max(500).nullable(),
  /** Design water flow of the zone, US gal/min. */
  flowGpm: z.number().positive().max(2_000).nullable(),
  /** Water pressure at the heads at design flow, psi gauge. */
  designPressurePsi: z.number().positive().max(300).nullable(),
  /** Elevation of the highest head over the air connection, ft; negative below it. */
  elevationFt: z.number().min(-500).max(500).nullable(),
  /** Length of pipe from the air connection to the far end of the zone, ft. */
  distanceFt: z.number().min(0).max(20_000).nullable(),
  laterals: z.array(pipeRunSchema).max(20),
  lowestRatedPart: z
    .strictObject({ name: z.string().max(120), ratedPsi: z.number().positive().max(1_000) })
    .nullable(),
});

export type Zone = z.infer<typeof zoneSchema>;
