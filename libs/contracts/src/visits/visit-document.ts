import { systemSchema } from '@rimeward/field-log';
import { z } from 'zod';
import { reviewSchema } from '../review/decision';

export const visitPurposes = ['winterize', 'return-visit', 'spring'] as const;

export const siteSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  address: z.string(),
  town: z.string(),
  latitude: z.number().nullable(),
  longitude: z.number().nullable(),
  elevationFt: z.number().nullable(),
  /** Sensitive: the phone keeps these two encrypted. */
  accessNotes: z.string().nullable(),
  gateCode: z.string().nullable(),
});
export type Site = z.infer<typeof siteSchema>;

/** Everything a phone needs of one visit before it leaves the yard. */
export const visitDocumentSchema = z.object({
  id: z.uuid(),
  date: z.iso.date(),
  /** Place in the day's driving order, from 1. */
  sequence: z.number().int(),
  purpose: z.enum(visitPurposes),
  /** Why the office planned it so: what matters before opening the gate. */
  note: z.string().nullable(),
  crew: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  assigned: z.array(z.object({ userId: z.uuid(), name: z.string() })),
  customer: z.object({ name: z.string(), phone: z.string().nullable() }),
  site: siteSchema,
  system: systemSchema,
  lastYear: z
    .object({
      date: z.iso.date(),
      technicians: z.array(z.string()),
      notes: z.array(z.string()),
      partsTakenOut: z.array(z.string()),
    })
    .nullable(),
  reviews: z.array(reviewSchema),
});
export type VisitDocument = z.infer<typeof visitDocumentSchema>;
