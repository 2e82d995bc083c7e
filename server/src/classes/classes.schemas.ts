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
      /** Told to the class's trainers only. */
      joinCode: z.string().nullable(),
      members: z.number(),
      trainer: z.boolean(),
    }),
  ),
});
export type ClassList = z.infer<typeof classListSchema>;

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
