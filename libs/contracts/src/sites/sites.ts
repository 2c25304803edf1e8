import { systemSchema } from '@rimeward/field-log';
import { z } from 'zod';
import { siteSchema } from '../visits/visit-document';

const customerSchema = z.object({ id: z.uuid(), name: z.string(), phone: z.string().nullable() });

/** One line of the list of sites: no access notes and no gate code. */
export const siteListItemSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  address: z.string(),
  town: z.string(),
  customerName: z.string(),
  systems: z.number().int(),
  zones: z.number().int(),
});
export type SiteListItem = z.infer<typeof siteListItemSchema>;

/** GET /api/sites?q=&after=&limit= : by name, keyset pages. A technician finds the sites of his own visits only. */
export const siteListResponseSchema = z.object({
  sites: z.array(siteListItemSchema),
  next: z.string().nullable(),
});
export type SiteListResponse = z.infer<typeof siteListResponseSchema>;

/** GET /api/sites/:id */
export const siteRecordSchema = z.object({
  site: siteSchema,
  customer: customerSchema,
  systems: z.array(systemSchema),
});
export type SiteRecord = z.infer<typeof siteRecordSchema>;
