import { z } from 'zod';
import { questionViewSchema, rawAnswerSchema, readingSchema } from '../questions/question-view.ts';
import { paperSlugSchema } from './papers.schemas.ts';

const instant = z.iso.datetime();

/** Nothing unprintable, and nothing PostgreSQL refuses to keep. */
const name = z
  .string()
  .trim()
  .max(100)
  .regex(/^[^\p{Cc}\p{Surrogate}]*$/u, 'holds characters that no name has');

export const startSittingSchema = z.strictObject({
  paper: paperSlugSchema,
  agreed: z.literal(true, { error: 'agree to the rules of the sitting first' }),
  agreementHash: z.string().regex(/^[0-9a-f]{64}$/),
  givenName: name.min(1, 'the certificate needs a name'),
  familyName: name,
});
export type StartSitting = z.infer<typeof startSittingSchema>;

export const itemKeySchema = z.string().regex(/^[a-z0-9]{1,20}$/);
export const partSchema = z.string().regex(/^[a-z0-9-]{1,20}$/);

export const saveAnswerSchema = z.strictObject({
  answer: rawAnswerSchema,
  sequence: z.int().min(1).max(1_000_000_000),
  idempotencyKey: z.uuid(),
});
export type SaveAnswer = z.infer<typeof saveAnswerSchema>;

export const comeBackSchema = z.strictObject({ comeBack: z.boolean() });
export type ComeBack = z.infer<typeof comeBackSchema>;

export const emptySchema = z.strictObject({});

const savedAnswerSchema = rawAnswerSchema.extend({
  savedAt: instant,
  receipt: z.string(),
  sequence: z.number(),
});

/** A sitting as its candidate sees it: no key, and once handed in no questions either. */
export const sittingViewSchema = z.object({
  id: z.uuid(),
  paper: z.object({
    slug: z.string(),
    number: z.string(),
    title: z.string(),
    sat: z.string(),
    aids: z.array(z.string()),
  }),
  name: z.string(),
  startedAt: instant,
  closesAt: instant,
  now: instant,
  minutes: z.number(),
  marks: z.number(),
  passPercent: z.number(),
  state: z.enum(['open', 'handed-in']),
  handedInAt: instant.nullable(),
  handedInHow: z.enum(['by-candidate', 'at-the-deadline']).nullable(),
  resultReady: z.boolean(),
  /** Another session of this person writes now. */
  readOnly: z.boolean(),
  items: z.array(
    z.object({
      key: z.string(),
      number: z.number(),
      subject: z.string(),
      question: questionViewSchema,
      answers: z.record(z.string(), savedAnswerSchema),
      comeBack: z.boolean(),
    }),
  ),
  /** The newest first; `item` is the question's number in the paper. */
  receipts: z.array(
    z.object({
      savedAt: instant,
      item: z.number(),
      part: z.string(),
      receipt: z.string(),
      sequence: z.number(),
    }),
  ),
});
export type SittingView = z.infer<typeof sittingViewSchema>;

export const savedSchema = z.object({
  savedAt: instant,
  receipt: z.string(),
  sequence: z.number(),
  reading: readingSchema,
  now: instant,
  closesAt: instant,
});
export type Saved = z.infer<typeof savedSchema>;

export const handedInSchema = z.object({ state: z.literal('handed-in'), handedInAt: instant });
export type HandedIn = z.infer<typeof handedInSchema>;

export const resultViewSchema = z.object({
  id: z.uuid(),
  paper: z.object({ slug: z.string(), number: z.string(), title: z.string() }),
  name: z.string(),
  satOn: z.iso.date(),
  handedInHow: z.enum(['by-candidate', 'at-the-deadline']),
  markedAt: instant,
  marks: z.number(),
  outOf: z.number(),
  percent: z.number(),
  passPercent: z.number(),
  passMarks: z.number(),
  passed: z.boolean(),
  bySubject: z.array(
    z.object({
      subject: z.string(),
      name: z.string(),
      marks: z.number(),
      outOf: z.number(),
      practise: z
        .object({ sheet: z.string(), title: z.string(), worksheet: z.string().nullable() })
        .nullable(),
    }),
  ),
  maySitAgainAt: instant.nullable(),
  appeal: z.string(),
  certificate: z.object({ id: z.uuid(), number: z.string(), ready: z.boolean() }).nullable(),
});
export type ResultView = z.infer<typeof resultViewSchema>;
