import { z } from 'zod';
import { SUBJECTS } from '../subjects.ts';

const text = z.string().trim().min(1).max(600);
const line = z.string().trim().min(1).max(160);
/** YAML reads 3 as a number and "3 %" as text; both are quantities. */
const figure = z.union([z.number(), z.string().trim().min(1).max(40)]).transform(String);
const name = z
  .string()
  .regex(/^[a-z][A-Za-z0-9]{0,23}$/, 'a name is letters and digits, beginning with a small letter');
const partId = z.string().regex(/^[a-h]$/, 'parts are lettered a to h');

const given = z.strictObject({
  is: line,
  symbol: line.optional(),
  value: figure.optional(),
  from: figure.optional(),
  to: figure.optional(),
  step: figure.optional(),
  'one of': z.array(figure).min(1).max(40).optional(),
  stock: z.enum(['cable', 'fuse']).optional(),
  unit: z.string().max(20).optional(),
  shown: z.boolean().default(true),
  figures: z.int().min(1).max(6).nullable().optional(),
});

const step = z.strictObject({
  symbol: line,
  unit: z.string().max(20).default(''),
  is: z.string().max(300),
  figures: z.int().min(1).max(6).default(3),
});

const read = z.strictObject({
  symbol: line,
  unit: z.string().max(20),
  of: z.enum([
    'bulk ends',
    'float starts',
    'absorption lasts',
    'amps before float',
    'amps at',
    'volts at',
    'battery amps at',
  ]),
  at: name.optional(),
  because: text,
  figures: z.int().min(1).max(6).default(3),
});

const stage = z.enum(['bulk', 'absorption', 'float']);

const curve = z.strictObject({
  battery: z.strictObject({
    kind: z.enum(['flooded', 'agm', 'gel']),
    capacity: name,
    charge: name,
    blocks: z.int().min(1).max(4).default(1),
  }),
  charger: z.strictObject({
    limit: name,
    absorption: name,
    float: name,
    tail: name,
    'longest absorption': name.optional(),
  }),
  load: z.strictObject({ amps: name, from: name.optional() }).optional(),
  hours: z.number().min(0.5).max(24),
  intervals: z.record(
    z.string().regex(/^[A-E]$/, 'intervals are lettered A to E'),
    z.union([stage, z.strictObject({ stage, before: name.optional(), after: name.optional() })]),
  ),
  reads: z.record(name, read).default({}),
});

const marking = {
  marks: z.int().min(1).max(10),
  carry: z.enum(['none', 'own', 'never']).default('none'),
  because: text.optional(),
};
const quantityAsk = z.strictObject({
  find: name,
  units: z.array(z.string().min(1).max(20)).max(6).default([]),
  within: z.union([z.literal('exact'), figure]),
  round: z
    .strictObject({ to: figure, way: z.enum(['up', 'down', 'nearest']), say: line })
    .optional(),
  ...marking,
});
const sizeAsk = z.strictObject({
  size: name,
  stock: z.enum(['cable', 'fuse']).default('cable'),
  from: figure,
  to: figure,
  ...marking,
});
const choiceAsk = z.strictObject({
  choose: z
    .array(
      z.strictObject({
        is: text,
        right: z.union([z.boolean(), z.string().max(300)]).default(false),
        say: text.optional(),
      }),
    )
    .min(2)
    .max(8),
  ...marking,
});
const stageAsk = z.strictObject({ stage: z.string().regex(/^[A-E]$/), ...marking });

const slip = z.strictObject({
  is: text,
  say: text,
  credit: text.optional(),
  makes: z.record(name, z.string().max(300)),
  keep: z.record(name, z.int().min(0).max(9)).default({}),
});

/** Front matter of a question sheet. */
export const sheetSchema = z.strictObject({
  id: z.string().regex(/^[a-z]{2}-[a-z0-9-]{2,40}$/, 'an id is like vd-chart-table'),
  title: line,
  revision: z.string().regex(/^[A-Z]$/, 'a revision is one capital letter'),
  subject: z.enum(Object.keys(SUBJECTS)),
  level: z.enum(['recall', 'apply', 'reason']),
  pool: z.enum(['practice', 'paper']),
  lesson: z.string().regex(/^\d\.\d{1,2}$/, 'a lesson is quoted, like "3.4"'),
  profile: z.enum(['metric', 'awg']),
  language: z.string().regex(/^[a-z]{2}$/),
  author: line,
  'checked by': line,
  sources: z.array(text).min(1),
  aids: z.array(line).default([]),
  cautions: z
    .array(
      z.strictObject({
        level: z.enum(['danger', 'warning', 'caution', 'notice', 'mandatory']),
        title: line,
        text,
      }),
    )
    .default([]),
  given: z.record(name, given),
  steps: z.record(name, step).default({}),
  require: z.array(z.string().max(300)).default([]),
  curve: curve.optional(),
  ask: z.record(partId, z.union([quantityAsk, sizeAsk, choiceAsk, stageAsk])),
  slips: z.array(slip).default([]),
  diagram: z
    .strictObject({
      kind: z.literal('two-wire-run'),
      source: line,
      fuse: line,
      load: line,
      'load note': line,
      cable: line,
      length: line,
      draws: z.enum(['lamp', 'motor', 'resistor']),
    })
    .optional(),
});

export type Sheet = z.infer<typeof sheetSchema>;
export type SheetGiven = Sheet['given'][string];
export type SheetAsk = Sheet['ask'][string];
