import { z } from 'zod';
import { cutShortReasons, presences, visitOutcomes } from '../words/words';

export const defectFoundBody = z.strictObject({
  zoneId: z.uuid().nullable(),
  where: z.string().max(200),
  what: z.string().min(1).max(1_000),
  recommended: z.string().max(1_000).optional(),
});

export const noteWrittenBody = z.strictObject({ text: z.string().min(1).max(4_000) });

export const leftBody = z.strictObject({
  outcome: z.enum(visitOutcomes),
  /** Asked for when the visit was cut short. */
  why: z.enum(cutShortReasons).nullable(),
  present: z.enum(presences),
  signerName: z.string().max(120).optional(),
  /** Strokes of the signature as an SVG path in a 300 x 100 box. */
  signaturePath: z.string().max(20_000).optional(),
  nextSteps: z.string().max(2_000).optional(),
});

/** The technician's answer to a question of the review. */
export const questionAnsweredBody = z.strictObject({
  questionId: z.uuid(),
  answer: z.string().min(1).max(4_000),
});

/**
 * A correction names an earlier entry and replaces its body; `body` null withdraws it (a slip).
 * The old entry stays in the log and on the screen.
 */
export const correctedBody = z.strictObject({
  of: z.uuid(),
  reason: z.string().min(1).max(1_000),
  body: z.record(z.string(), z.unknown()).nullable(),
});
