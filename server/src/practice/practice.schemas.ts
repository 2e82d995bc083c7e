import { SUBJECTS } from '@ferrule/assessments';
import { z } from 'zod';
import {
  answersSchema,
  lineSchema,
  markedQuestionSchema,
  PART_KINDS,
  questionViewSchema,
} from '../questions/question-view.ts';
import { PRACTICE_PROFILES } from '../school/practice-profile.ts';

const level = z.enum(['recall', 'apply', 'reason']);
const profile = z.enum(PRACTICE_PROFILES);

export const findPracticeSchema = z.strictObject({
  subject: z.enum(Object.keys(SUBJECTS)).optional(),
  level: level.optional(),
  lesson: z
    .string()
    .regex(/^\d{1,2}\.\d{1,2}$/, 'a sheet number, such as 3.4')
    .optional(),
});
export type FindPractice = z.infer<typeof findPracticeSchema>;

export const practiceListSchema = z.object({
  /** Under which the person’s school asks; questions of it come first. */
  profile,
  questions: z.array(
    z.object({
      slug: z.string(),
      title: z.string(),
      subject: z.object({ code: z.string(), name: z.string() }),
      level,
      /** Number of its sheet, issued or not. */
      lesson: z.string(),
      marks: z.number(),
      kinds: z.array(z.enum(PART_KINDS)),
      readsCurve: z.boolean(),
      /** Under which it is asked. */
      profile,
      /** How often the person answered it. */
      tries: z.number(),
      /** The best answer to the whole question without a hint, and its day. */
      best: z.object({ percent: z.number(), on: z.string() }).nullable(),
    }),
  ),
});
export type PracticeList = z.infer<typeof practiceListSchema>;

export const startPracticeSchema = z.strictObject({
  question: z.string().regex(/^[a-z0-9-]{1,80}$/, 'the short name of a question'),
  /** How many of the last steps are left to do; missing asks the question whole. */
  left: z.int().min(0).max(1_000).optional(),
});
export type StartPractice = z.infer<typeof startPracticeSchema>;

export const practiceViewSchema = z.object({
  id: z.string(),
  question: questionViewSchema,
  /** How many of the last steps may be left to do: none is worked in full, the most is whole. */
  levels: z.array(z.number()),
  left: z.number(),
  /** Parts of which something is worked. */
  shown: z.array(z.object({ part: z.string(), lines: z.array(lineSchema) })),
  /** Parts left to answer. */
  asked: z.array(z.string()),
});
export type PracticeView = z.infer<typeof practiceViewSchema>;

export const answerPracticeSchema = z.strictObject({ answers: answersSchema });
export type AnswerPractice = z.infer<typeof answerPracticeSchema>;

export const askHintSchema = z.strictObject({ part: z.string().min(1).max(10) });
export type AskHint = z.infer<typeof askHintSchema>;

export const hintSchema = z.object({
  /** Null where no formula leads to the part. */
  line: lineSchema.nullable(),
});
export type Hint = z.infer<typeof hintSchema>;

export const practiceMarkedSchema = z.object({
  marked: markedQuestionSchema,
  /** Parts a hint was given for. */
  hints: z.array(z.string()),
});
export type PracticeMarked = z.infer<typeof practiceMarkedSchema>;
