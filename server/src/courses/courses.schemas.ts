import { z } from 'zod';

export const frontSchema = z.object({
  demonstration: z.boolean(),
  school: z.object({ name: z.string(), address: z.string() }),
  course: z
    .object({
      number: z.string(),
      title: z.string(),
      sheets: z.number(),
      units: z.number(),
      questions: z.number(),
      minutesToRead: z.number(),
    })
    .nullable(),
  /** Whom to sign in as; only in the demonstration. */
  people: z.array(z.object({ role: z.string(), name: z.string(), email: z.string() })),
  /** Opens the class of the demonstration to whoever signs up. */
  joinCode: z.string().nullable(),
});
export type Front = z.infer<typeof frontSchema>;

const sheetSchema = z.object({
  number: z.string(),
  slug: z.string(),
  title: z.string(),
  state: z.enum(['not-begun', 'begun', 'done']),
  revised: z.object({ from: z.string(), to: z.string() }).nullable(),
  paragraph: z.number().nullable(),
  doneOn: z.string().nullable(),
});

const unitWorksheetSchema = z.object({
  number: z.string(),
  title: z.string(),
  questions: z.number(),
  passPercent: z.number(),
  best: z
    .object({ marks: z.number(), outOf: z.number(), percent: z.number(), on: z.string() })
    .nullable(),
  lit: z.boolean(),
  attempts: z.number(),
  openAttemptId: z.string().nullable(),
});

export const courseMapSchema = z.object({
  number: z.string(),
  slug: z.string(),
  title: z.string(),
  revision: z.string(),
  issued: z.string(),
  owner: z.string(),
  trainer: z.string().nullable(),
  class: z.object({ id: z.string(), name: z.string() }).nullable(),
  enrolledOn: z.string().nullable(),
  intro: z.string(),
  carryOn: z
    .object({
      sheet: z.string(),
      title: z.string(),
      paragraph: z.number(),
      of: z.number(),
      minutesLeft: z.number(),
    })
    .nullable(),
  units: z.array(
    z.object({
      number: z.number(),
      title: z.string(),
      issued: z.boolean(),
      sheets: z.array(sheetSchema),
      worksheet: unitWorksheetSchema.nullable(),
    }),
  ),
  paper: z
    .object({
      slug: z.string(),
      number: z.string(),
      title: z.string(),
      state: z.enum(['open', 'waiting', 'sitting', 'passed']),
      mayStartAt: z.string().nullable(),
      sittingId: z.string().nullable(),
      certificateId: z.string().nullable(),
    })
    .nullable(),
});
export type CourseMap = z.infer<typeof courseMapSchema>;
