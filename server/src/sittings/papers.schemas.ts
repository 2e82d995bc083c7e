import { z } from 'zod';
import {
  answersSchema,
  markedQuestionSchema,
  questionViewSchema,
} from '../questions/question-view.ts';

const instant = z.iso.datetime();
const day = z.iso.date();

export const paperSlugSchema = z.string().regex(/^[a-z0-9-]{1,80}$/);
export const sittingIdSchema = z.uuid();

/** Where a person stands with a paper. */
export const standingSchema = z.object({
  state: z.enum(['open', 'waiting', 'sitting', 'passed']),
  reasons: z.array(z.string()),
  mayStartAt: instant.nullable(),
  sittingId: z.uuid().nullable(),
  certificateId: z.uuid().nullable(),
  sittings: z.array(
    z.object({
      id: z.uuid(),
      startedAt: instant,
      handedInAt: instant.nullable(),
      passed: z.boolean().nullable(),
    }),
  ),
});
export type StandingView = z.infer<typeof standingSchema>;

export const paperViewSchema = z.object({
  slug: z.string(),
  number: z.string(),
  title: z.string(),
  /** What this person is given, approved extra time included. */
  minutes: z.number(),
  extraTimePercent: z.number(),
  questions: z.number(),
  marks: z.number().nullable(),
  passPercent: z.number(),
  waitDays: z.number(),
  sat: z.string(),
  aids: z.array(z.string()),
  agreement: z.string(),
  agreementHash: z.string(),
  scheme: z.object({
    title: z.string(),
    revision: z.string(),
    scope: z.array(z.string()),
    limits: z.array(z.string()),
    validYears: z.number(),
  }),
  appeal: z.string(),
  standing: standingSchema,
});
export type PaperView = z.infer<typeof paperViewSchema>;

export const resultsQuerySchema = z.strictObject({
  cursor: z
    .string()
    .regex(/^[A-Za-z0-9_-]{1,200}$/)
    .optional(),
});
export type ResultsQuery = z.infer<typeof resultsQuerySchema>;

export const resultsPageSchema = z.object({
  results: z.array(
    z.object({
      id: z.uuid(),
      name: z.string(),
      satOn: day,
      handedInHow: z.enum(['by-candidate', 'at-the-deadline']),
      percent: z.number().nullable(),
      passed: z.boolean().nullable(),
      looks: z.number(),
    }),
  ),
  nextCursor: z.string().nullable(),
});
export type ResultsPage = z.infer<typeof resultsPageSchema>;

export const lookSchema = z.strictObject({
  reason: z
    .string()
    .trim()
    .min(10, 'give the reason in ten letters or more')
    .max(500)
    .regex(/^[^\0\p{Surrogate}]*$/u, 'holds characters that cannot be kept'),
});
export type Look = z.infer<typeof lookSchema>;

/** A marked paper as a certification manager sees it; every look is recorded. */
export const openedItemsSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  satOn: day,
  marks: z.number(),
  outOf: z.number(),
  passed: z.boolean(),
  looks: z.array(z.object({ at: instant, by: z.string(), reason: z.string() })),
  items: z.array(
    z.object({
      number: z.number(),
      subject: z.string(),
      question: questionViewSchema,
      answers: answersSchema,
      marked: markedQuestionSchema,
    }),
  ),
});
export type OpenedItems = z.infer<typeof openedItemsSchema>;

export const timeAllowanceSchema = z.strictObject({
  email: z.string().trim().toLowerCase().min(3).max(254),
  percent: z.int().min(0).max(300),
  reason: lookSchema.shape.reason,
});
export type TimeAllowance = z.infer<typeof timeAllowanceSchema>;

/** Extra time as it counts for a person's next sitting. */
const grantedTimeSchema = z.object({
  name: z.string(),
  email: z.string(),
  percent: z.number(),
  reason: z.string(),
  grantedAt: instant,
});
export type GrantedTime = z.infer<typeof grantedTimeSchema>;

export const grantedTimesSchema = z.object({ allowances: z.array(grantedTimeSchema) });
export type GrantedTimes = z.infer<typeof grantedTimesSchema>;
