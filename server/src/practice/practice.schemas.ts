import { z } from 'zod';
import {
  answersSchema,
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

export const practiceMarkedSchema = z.object({ marked: markedQuestionSchema });
export type PracticeMarked = z.infer<typeof practiceMarkedSchema>;
