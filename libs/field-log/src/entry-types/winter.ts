import { z } from 'zod';

export const drainSetBody = z.strictObject({
  drainId: z.uuid(),
  ranDry: z.boolean(),
  position: z.enum(['open', 'closed']),
});

export const pumpDrainedBody = z.strictObject({ pumpId: z.uuid(), drained: z.boolean() });

/** The cap or plug is back on the air connection. */
export const connectionPluggedBody = z.strictObject({ plugged: z.boolean() });

export const controllerSetBody = z.strictObject({ mode: z.enum(['off', 'rain', 'still-on']) });

export const insulatedBody = z.strictObject({
  what: z.enum(['backflow', 'pump', 'pipe']),
  note: z.string().max(500).optional(),
});
