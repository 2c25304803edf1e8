import { z } from 'zod';

export const reviewDecisions = ['accepted', 'sent-back', 'return-visit'] as const;

export const reviewQuestionSchema = z.strictObject({
  id: z.uuid(),
  text: z.string().min(1).max(2_000),
  ruleId: z.string().max(60).nullable(),
});

/** One decision of a supervisor on a visit; decisions are appended, never changed. */
export const reviewSchema = z.object({
  id: z.uuid(),
  visitId: z.uuid(),
  /** 1 for the visit's first decision. */
  number: z.number().int().min(1),
  decision: z.enum(reviewDecisions),
  remark: z.string().nullable(),
  questions: z.array(reviewQuestionSchema),
  by: z.object({ id: z.uuid(), name: z.string() }),
  at: z.iso.datetime(),
  /** Position of the newest entry that the supervisor had before him. */
  seenPosition: z.number().int(),
});
export type Review = z.infer<typeof reviewSchema>;

/** POST /api/review/visits/:id/decisions; `expectedNumber` is the number of decisions seen, else `changed-since-opened`. */
export const decideRequestSchema = z.strictObject({
  decision: z.enum(reviewDecisions),
  remark: z.string().max(4_000).nullable(),
  questions: z.array(reviewQuestionSchema).max(40),
  expectedNumber: z.number().int().min(0),
  seenPosition: z.number().int().min(0),
});
export type DecideRequest = z.infer<typeof decideRequestSchema>;
