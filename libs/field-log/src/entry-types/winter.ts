import { z } from 'zod';
import { controllerModes, drainPositions, insulatedThings } from '../words/words';

export const drainSetBody = z.strictObject({
  drainId: z.uuid(),
  ranDry: z.boolean(),
  position: z.enum(drainPositions),
});

export const pumpDrainedBody = z.strictObject({ pumpId: z.uuid(), drained: z.boolean() });

/** The cap or plug is back on the air connection. */
export const connectionPluggedBody = z.strictObject({ plugged: z.boolean() });

export const controllerSetBody = z.strictObject({ mode: z.enum(controllerModes) });

export const insulatedBody = z.strictObject({
  what: z.enum(insulatedThings),
  note: z.string().max(500).optional(),
});
