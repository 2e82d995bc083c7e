import { z } from 'zod';
import { drawingsSchema } from './drawing-view.ts';
import { workedAnswerSchema } from '../questions/question-view.ts';

export const lessonNumberSchema = z
  .string()
  .regex(/^\d{1,2}\.\d{1,2}$/, 'a sheet number, such as 3.4');

const treeSchema = z.object({ type: z.literal('root'), children: z.array(z.any()) });
const neighbourSchema = z.object({ number: z.string(), title: z.string() }).nullable();

export const lessonViewSchema = z.object({
  number: z.string(),
  slug: z.string(),
  title: z.string(),
  revision: z.string(),
  issued: z.string(),
  language: z.string(),
  unit: z.object({ number: z.number(), title: z.string() }),
  author: z.string(),
  checkedBy: z.string(),
  minutes: z.number(),
  lead: z.string(),
  can: z.array(z.string()),
  /** What `can` says, each with what asks for it: practice questions by slug, recall by number. */
  objectives: z.array(
    z.object({
      does: z.string(),
      questions: z.array(z.string()),
      recall: z.array(z.number()),
    }),
  ),
  /** Sheets to read before this one. */
  needs: z.array(z.object({ number: z.string(), title: z.string() })),
  headings: z.array(z.object({ text: z.string(), paragraph: z.number() })),
  body: z.string(),
  paragraphs: z.number(),
  words: z.array(z.object({ term: z.string(), meaning: z.string() })),
  /** Terms of the glossary that the sheet uses, each with the forms it goes by. */
  terms: z.array(z.object({ term: z.string(), means: z.string(), forms: z.array(z.string()) })),
  sources: z.array(z.string()),
  recall: z.array(z.object({ ask: z.string(), answer: z.string() })),
  /** MathML by the formula's source. */
  formulas: z.record(z.string(), treeSchema),
  /** Cleaned drawings by the figure's `src`. */
  figures: z.record(
    z.string(),
    z.object({
      tree: treeSchema,
      narrow: treeSchema.nullable(),
      short: z.string(),
      long: z.string(),
    }),
  ),
  /** Data of the drawings to handle, by kind. */
  drawings: drawingsSchema,
  /** Worked answers by `question#seed`. */
  worked: z.record(z.string(), workedAnswerSchema),
  /** Questions of the sheet's try blocks. */
  tries: z.array(z.string()),
  previous: neighbourSchema,
  next: neighbourSchema,
});
export type LessonView = z.infer<typeof lessonViewSchema>;

export const lessonProgressSchema = z.object({
  state: z.enum(['not-begun', 'begun', 'done']),
  paragraph: z.number(),
  /** The revision that was marked done, if any. */
  revisionRead: z.string().nullable(),
  current: z.string(),
});
export type LessonProgressView = z.infer<typeof lessonProgressSchema>;

export const readToSchema = z.strictObject({ paragraph: z.number().int().min(1).max(1_000) });
export type ReadTo = z.infer<typeof readToSchema>;

export const markDoneSchema = z.strictObject({ revision: z.string().min(1).max(20) });
export type MarkDone = z.infer<typeof markDoneSchema>;
