import { z } from 'zod';

const memberUnitSchema = z.object({
  number: z.number(),
  sheetsDone: z.number(),
  sheetsBegun: z.number(),
  lamp: z.enum(['lit', 'not-passed', 'not-sat', 'none']),
  percent: z.number().nullable(),
});

const memberSchema = z.object({
  id: z.string(),
  givenName: z.string(),
  familyName: z.string(),
  joinedOn: z.string(),
  lastSeenOn: z.string().nullable(),
  daysThere: z.number(),
  /** The sheet the person is on, or "all read". */
  at: z.string(),
  units: z.array(memberUnitSchema),
  paper: z.enum(['not-sat', 'sitting', 'passed', 'not-passed']),
  attempts: z.array(
    z.object({
      id: z.string(),
      worksheet: z.string(),
      attempt: z.number(),
      handedInOn: z.string(),
      marks: z.number(),
      outOf: z.number(),
    }),
  ),
});

export const classViewSchema = z.object({
  id: z.string(),
  name: z.string(),
  school: z.string(),
  course: z.object({ number: z.string(), title: z.string() }),
  startsOn: z.string(),
  endsOn: z.string(),
  joinCode: z.string(),
  trainers: z.array(z.string()),
  units: z.array(
    z.object({
      number: z.number(),
      title: z.string(),
      sheets: z.number(),
      worksheet: z.string().nullable(),
    }),
  ),
  members: z.array(memberSchema),
  slips: z.array(
    z.object({
      question: z.string(),
      part: z.string(),
      says: z.string(),
      count: z.number(),
      of: z.number(),
    }),
  ),
  /** Too few people have answered to speak of common slips. */
  tooFew: z.boolean(),
});
export type ClassView = z.infer<typeof classViewSchema>;
