import { z } from 'zod';

/** RFC 9457 problem details. */
export const problemSchema = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string().optional(),
  instance: z.string(),
  errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
});

export type Problem = z.infer<typeof problemSchema>;
