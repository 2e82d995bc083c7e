import { z } from 'zod';
import { figure, figures, name, sum } from './schema-words.ts';

const step = z.strictObject({
  unit: z.string().max(20).default(''),
  is: sum,
  /** Significant figures; null prints the figure as short as it is, for a stock size. */
  figures: figures.nullable().default(3),
});

/** Sums of a lesson: named given values, and steps worked from them. */
export const sumsSchema = z.strictObject({
  profile: z.enum(['metric', 'awg']).default('metric'),
  given: z.record(name, figure).default({}),
  steps: z.record(name, step).default({}),
});
export type Sums = z.infer<typeof sumsSchema>;
