import { z } from 'zod';
import { valvePositions, valveStages, waterOffKinds } from '../words/words';

export const waterOffBody = z.strictObject({
  kind: z.enum(waterOffKinds),
  note: z.string().max(1_000).optional(),
});

/** Residual pressure let out through a zone; `zoneId` null when a drain or test cock was used. */
export const pressureRelievedBody = z.strictObject({ zoneId: z.uuid().nullable() });

/**
 * One hand valve of the backflow assembly, one entry each. `before-air` is its position while air is on,
 * `winter` the position in which it stays.
 */
export const valveSetBody = z.strictObject({
  valveId: z.string().min(1).max(40),
  stage: z.enum(valveStages),
  position: z.enum(valvePositions),
  workedThrough: z.boolean(),
  note: z.string().max(500).optional(),
});
