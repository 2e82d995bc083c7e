import { z } from 'zod';

const subjectSchema = z.object({ code: z.string(), name: z.string() });

export const subjectRecordsSchema = z.object({
  /** The twelve subjects of the bank, in its order. */
  subjects: z.array(
    subjectSchema.extend({
      /** Questions the practice bank holds. */
      questions: z.number(),
      /** How many of them were answered whole, without a hint and well enough. */
      shown: z.number(),
      /** On how many separate days something of the subject was shown. */
      days: z.number(),
      lastDay: z.string().nullable(),
    }),
  ),
  /** At most three questions, the most useful first. */
  next: z.array(
    z.object({
      slug: z.string(),
      title: z.string(),
      subject: subjectSchema,
      level: z.enum(['recall', 'apply', 'reason']),
      lesson: z.string(),
      marks: z.number(),
      reason: z.enum(['went-wrong', 'one-day-only', 'with-help', 'never-tried', 'longest-ago']),
      /** The reason in a sentence. */
      says: z.string(),
      /** The day it was answered last. */
      lastDay: z.string().nullable(),
    }),
  ),
});
export type SubjectRecords = z.infer<typeof subjectRecordsSchema>;
