import { z } from 'zod';
import { day, language, lessonNumber, line, revision, slug, subject } from './sheet-fields.ts';

const LEAST_RECALL = 3;

/** A slug of the bank, or a recall question of the sheet by its place. */
const asked = z
  .string({ error: 'a question of the bank, or "recall 1"' })
  .regex(/^([a-z0-9]+(-[a-z0-9]+)*|recall \d{1,2})$/, 'a question of the bank, or "recall 1"');

/** Words alone say what the reader can do; the questions that ask for it may follow. */
const objective = z.preprocess(
  (entry) => (typeof entry === 'string' ? { does: entry } : entry),
  z.strictObject({ does: line(200), questions: z.array(asked).max(20).default([]) }),
);

/** Front matter of a lesson. */
export const lessonFrontMatter = z.strictObject({
  number: lessonNumber,
  slug,
  title: line(120),
  revision,
  issued: day,
  language,
  unit: z.number().int().min(1).max(99),
  subject,
  level: z.enum(['recall', 'apply', 'reason']),
  pool: z.literal('practice', { error: 'lessons are for practice: write pool: practice' }),
  author: line(80),
  checkedBy: line(80),
  minutes: z.number().int().min(1).max(180),
  lead: line(500),
  can: z.array(objective).min(1, 'say at least one thing the reader can do afterwards').max(12),
  /** Sheets to read before this one. */
  needs: z.array(lessonNumber).max(10).default([]),
  /** Read by the question library, which knows how sums are written. */
  sums: z.unknown().optional(),
  words: z.record(line(60), line(300)).default({}),
  sources: z.array(line(300)).min(1, 'name at least one source').max(40),
  cautions: z.array(line(120)).max(20).default([]),
  recall: z
    .array(z.strictObject({ ask: line(400), answer: line(800) }))
    .min(LEAST_RECALL, `too few recall questions: at least ${LEAST_RECALL}`)
    .max(20),
});
export type LessonFrontMatter = z.infer<typeof lessonFrontMatter>;
