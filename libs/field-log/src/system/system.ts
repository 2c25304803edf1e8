import { z } from 'zod';
import { removalMethods, sensitivePartKinds } from '../words/words';
import { backflowAssemblySchema } from './backflow';
import { pipeRunSchema } from './pipe-run';
import { zoneSchema } from './zone';

export const sensitivePartSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(sensitivePartKinds),
  place: z.string().max(200),
  sizeIn: z.number().positive().max(12).nullable(),
  hasBypass: z.boolean(),
});
export type SensitivePart = z.infer<typeof sensitivePartSchema>;

/** `upstream` is the drain between the water shutoff and the backflow assembly. */
export const drainSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(['upstream', 'manual', 'automatic']),
  place: z.string().max(200),
});
export type Drain = z.infer<typeof drainSchema>;

/** Everything the company knows about one irrigation system. US customary units; gauge pressure. */
export const systemSchema = z.strictObject({
  id: z.uuid(),
  name: z.string().max(120),
  removalMethod: z.enum(removalMethods),
  pointOfConnection: z.strictObject({
    kind: z.enum(['building', 'street', 'pump', 'unknown']),
    place: z.string().max(200),
  }),
  waterShutoff: z.strictObject({
    place: z.string().max(200),
    kind: z.enum(['ball', 'gate', 'curb-stop', 'unknown']),
  }),
  backflow: backflowAssemblySchema,
  airConnection: z.strictObject({
    kind: z.enum(['blow-out-fitting', 'quick-coupler', 'hose-bib', 'unknown']),
    place: z.string().max(200),
    /** Null when nobody has recorded it: the technician finds out on site. */
    downstreamOfBackflow: z.boolean().nullable(),
  }),
  mainLine: z.array(pipeRunSchema).max(40),
  sensitiveParts: z.array(sensitivePartSchema).max(40),
  controller: z.strictObject({ place: z.string().max(200), zoneCount: z.number().int().min(0).nullable() }),
  drains: z.array(drainSchema).max(40),
  pump: z.strictObject({ id: z.uuid(), place: z.string().max(200) }).nullable(),
  zones: z.array(zoneSchema).max(200),
});

export type System = z.infer<typeof systemSchema>;
