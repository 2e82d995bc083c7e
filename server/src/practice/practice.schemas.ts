import { z } from 'zod';
import {
  answersSchema,
  lineSchema,
  markedQuestionSchema,
  questionViewSchema,
} from '../questions/question-view.ts';

export const startPracticeSchema = z.strictObject({
  question: z.string().regex(/^[a-z0-9-]{1,80}$/, 'the short name of a question'),
});
export type StartPractice = z.infer<typeof startPracticeSchema>;

export const practiceViewSchema = z.object({ id: z.string(), question: questionViewSchema });
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
