import { z } from 'zod';
import {
  answersSchema,
  markedQuestionSchema,
  questionViewSchema,
  readingSchema,
} from '../questions/question-view.ts';

export const worksheetNumberSchema = z
  .string()
  .regex(/^W\d{1,2}$/, 'a worksheet number, such as W3');
export const itemKeySchema = z.string().regex(/^\d{1,2}$/, 'the key of an item, such as 1');

const unitSchema = z.object({ number: z.number(), title: z.string() });

export const worksheetSchema = z.object({
  id: z.string(),
  number: z.string(),
  title: z.string(),
  unit: unitSchema,
  variant: z.string(),
  attempt: z.number(),
  trainee: z.object({ givenName: z.string(), familyName: z.string() }),
  mine: z.boolean(),
  startedAt: z.string(),
  handedInAt: z.string().nullable(),
  passPercent: z.number(),
  setBy: z.string(),
  items: z.array(
    z.object({
      key: z.string(),
      /** By which the question can be practised. */
      slug: z.string(),
      question: questionViewSchema,
      answers: answersSchema,
      marked: markedQuestionSchema.nullable(),
      readAgain: z.object({ sheet: z.string(), title: z.string() }).nullable(),
    }),
  ),
  /** Of earlier sheets, said to oneself and never marked; answers once it is handed in. */
  recall: z.array(
    z.object({
      sheet: z.object({ number: z.string(), title: z.string() }),
      ask: z.string(),
      answer: z.string().nullable(),
    }),
  ),
  marks: z.number().nullable(),
  outOf: z.number(),
  percent: z.number().nullable(),
  passed: z.boolean().nullable(),
  savedAt: z.string().nullable(),
});
export type WorksheetView = z.infer<typeof worksheetSchema>;

export const worksheetSummarySchema = z.object({
  number: z.string(),
  title: z.string(),
  unit: unitSchema,
  questions: z.number(),
  /** Its questions in their order, by which they can be practised one at a time. */
  practise: z.array(z.string()),
  passPercent: z.number(),
  attempts: z.array(
    z.object({
      id: z.string(),
      attempt: z.number(),
      startedAt: z.string(),
      handedInAt: z.string().nullable(),
      marks: z.number().nullable(),
      outOf: z.number(),
      percent: z.number().nullable(),
    }),
  ),
});
export type WorksheetSummary = z.infer<typeof worksheetSummarySchema>;

export const saveAnswersSchema = z.strictObject({ answers: answersSchema });
export type SaveAnswers = z.infer<typeof saveAnswersSchema>;

export const savedAnswersSchema = z.object({
  savedAt: z.string(),
  readings: z.record(z.string(), readingSchema),
});
export type SavedAnswers = z.infer<typeof savedAnswersSchema>;

export const handInSchema = z.strictObject({});
