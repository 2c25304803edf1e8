import { z } from 'zod';
import { geoPointSchema } from '../entry/envelope';
import { cardLanguages, removalMethods, skies } from '../words/words';

/** A crew has reached the site: who, with what, in which weather. */
export const arrivedBody = z.strictObject({
  position: geoPointSchema.nullable(),
  airTemperatureF: z.number().min(-60).max(130).nullable(),
  sky: z.enum(skies).nullable(),
  crew: z.array(z.uuid()).max(12),
  compressorId: z.uuid().nullable(),
  hoseId: z.uuid().nullable(),
  removalMethod: z.enum(removalMethods),
});

/** The caution card was read before the first air of the day. */
export const cautionsReadBody = z.strictObject({ card: z.string().max(40), language: z.enum(cardLanguages) });

/** Something was already broken before work began. */
export const damageSeenBody = z.strictObject({ where: z.string().max(200), what: z.string().max(1_000) });
