import { z } from 'zod';
import { problemCodes } from './problem-codes';

/** RFC 9457 problem details with our `code` and, for forms, the fields at fault. */
export const problemDetailsSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  code: z.enum(problemCodes),
  detail: z.string().optional(),
  /** Path of the field and a stable word for what is wrong with it (`required`, `too-long`, `too-short`, `invalid`). */
  fields: z.array(z.object({ path: z.string(), fault: z.string() })).optional(),
  retryAfterSeconds: z.number().optional(),
});
export type ProblemDetails = z.infer<typeof problemDetailsSchema>;
