import { z } from 'zod';

export const classListSchema = z.object({
  classes: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      school: z.string(),
      course: z.string(),
      startsOn: z.string(),
      endsOn: z.string(),
      /** Told to the class's trainers and to administrators only. */
      joinCode: z.string().nullable(),
      members: z.number(),
      trainer: z.boolean(),
    }),
  ),
});
export type ClassList = z.infer<typeof classListSchema>;

const lineOf = (most: number) =>
  z
    .string()
    .trim()
    .min(1, 'Give the class a name.')
    .max(most)
    .regex(/^[^\p{Cc}\p{Zl}\p{Zp}<>]*$/u, 'Use one line of letters, digits and signs.');

export const openClassSchema = z
  .strictObject({
    name: lineOf(100),
    startsOn: z.iso.date(),
    endsOn: z.iso.date(),
    /** Emails of those who train it. */
    trainers: z
      .array(z.string().trim().max(254).toLowerCase().pipe(z.email()))
      .min(1, 'Name at least one trainer by email.')
      .max(20),
  })
  .refine(({ startsOn, endsOn }) => endsOn >= startsOn, {
    path: ['endsOn'],
    message: 'The last day cannot be before the first.',
  });
export type OpenClass = z.infer<typeof openClassSchema>;

export const openedClassSchema = z.object({
  class: z.object({ id: z.string(), name: z.string(), joinCode: z.string() }),
});
export type OpenedClass = z.infer<typeof openedClassSchema>;

export const joinClassSchema = z.strictObject({
  joinCode: z
    .string()
    .trim()
    .regex(/^[A-Za-z0-9 -]{1,40}$/, 'letters, digits and hyphens, as the school gave it'),
});
export type JoinClass = z.infer<typeof joinClassSchema>;

export const joinedClassSchema = z.object({
  class: z.object({ id: z.string(), name: z.string() }),
});
export type JoinedClass = z.infer<typeof joinedClassSchema>;
