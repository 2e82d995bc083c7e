import { z } from 'zod';
import { figure, line, name, text } from './schema-words.ts';
import { STOCK_NAMES } from './stock-series.ts';

const marking = {
  marks: z.int().min(1).max(10),
  carry: z.enum(['none', 'own', 'never']).default('none'),
  because: text.optional(),
  read: line.optional(),
};

const find = z.strictObject({
  find: name,
  units: z.array(z.string().min(1).max(20)).max(6).default([]),
  within: z.union([z.literal('exact'), figure]),
  round: z
    .strictObject({ to: figure, way: z.enum(['up', 'down', 'nearest']), say: line })
    .optional(),
  ...marking,
});

const size = z.strictObject({
  size: name,
  stock: z.enum(STOCK_NAMES).default('cable'),
  from: figure,
  to: figure,
  ...marking,
});

const options = z
  .array(
    z.strictObject({
      is: text,
      right: z.union([z.boolean(), z.string().max(300)]).default(false),
      say: text.optional(),
    }),
  )
  .min(2, 'a choice has two options at least')
  .max(8, 'a choice has eight options at most');
const choose = z.strictObject({ choose: options, ...marking });
const chooseAll = z.strictObject({ 'choose all': options, ...marking });

const stage = z.strictObject({ stage: z.string().regex(/^[A-E]$/), ...marking });

const order = z.strictObject({
  order: z
    .record(name, text)
    .refine((steps) => isBetween(Object.keys(steps).length, 3, 8), 'an order has 3 to 8 steps'),
  misplaced: z
    .array(z.strictObject({ first: name, then: name, say: text }))
    .min(2, 'write words for two misplaced pairs at least'),
  ...marking,
});

const match = z.strictObject({
  match: z
    .record(line, figure)
    .refine((rows) => isBetween(Object.keys(rows).length, 2, 8), 'a match has 2 to 8 pairs'),
  also: z.array(figure).max(4).default([]),
  mixed: z
    .array(z.strictObject({ is: line, with: figure, say: text }))
    .min(2, 'write words for two mixed pairs at least'),
  ...marking,
});

function isBetween(count: number, least: number, most: number): boolean {
  return count >= least && count <= most;
}

const WAYS = { find, size, choose, 'choose all': chooseAll, stage, order, match };
type Way = keyof typeof WAYS;
type Ask = z.infer<(typeof WAYS)[Way]>;

function isWay(key: string): key is Way {
  return Object.hasOwn(WAYS, key);
}

/** One entry of `ask`. The way it asks is settled first, so that its faults are told by that way alone. */
export const ask = z.record(z.string(), z.unknown()).transform((entry, context): Ask => {
  const ways = Object.keys(entry).filter(isWay);
  const [way] = ways;
  if (way === undefined || ways.length > 1) {
    const message = `ask in one way, by one of: ${Object.keys(WAYS).join(', ')}`;
    context.issues.push({ code: 'custom', message, input: entry });
    return z.NEVER;
  }
  const checked = WAYS[way].safeParse(entry);
  if (checked.success) return checked.data;
  context.issues.push(...(checked.error.issues as typeof context.issues));
  return z.NEVER;
});
