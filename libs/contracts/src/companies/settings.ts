import { z } from 'zod';

export const languages = ['en', 'es'] as const;
export type Language = (typeof languages)[number];

export const roles = ['technician', 'supervisor', 'office', 'owner'] as const;
export type Role = (typeof roles)[number];

/** What a company has chosen for everyone: units, language of its documents, its own pressure cap. */
export const companySettingsSchema = z.strictObject({
  units: z.enum(['us', 'metric']),
  /** Pressure unit under metric. */
  metricPressure: z.enum(['kPa', 'bar']),
  language: z.enum(languages),
  timeZone: z.string().min(1).max(60),
  /** Company's own highest gauge pressure, psi; null leaves the default policy alone. */
  pressureCapPsi: z.number().positive().max(100).nullable(),
  forbidsWorkingAlone: z.boolean(),
});
export type CompanySettings = z.infer<typeof companySettingsSchema>;
