import { z } from 'zod';
import { SUBJECTS } from '../subjects.ts';
import { ask } from './ask-schema.ts';
import { curve } from './curve-schema.ts';
import { figure, figures, line, name, partId, sum, text } from './schema-words.ts';
import { STOCK_NAMES } from './stock-series.ts';
import { columnPath, lookUp, table, wrongWay } from './table-schema.ts';

const given = z.strictObject({
  is: line,
  symbol: line.optional(),
  value: figure.optional(),
  from: figure.optional(),
  to: figure.optional(),
  step: figure.optional(),
  'one of': z.array(figure).min(1).max(40).optional(),
  stock: z.enum(STOCK_NAMES).optional(),
  column: columnPath.optional(),
  unit: z.string().max(20).optional(),
  shown: z.boolean().default(true),
  figures: figures.nullable().optional(),
});

const step = z.strictObject({
  symbol: line,
  unit: z.string().max(20).default(''),
  is: sum.optional(),
  'look up': lookUp.optional(),
  figures: figures.default(3),
  says: line.optional(),
});

const slip = z.strictObject({
  is: text,
  say: text,
  credit: text.optional(),
  makes: z.record(name, wrongWay),
  keep: z.record(name, z.int().min(0).max(9)).default({}),
});

/** A record of so many entries at most: a sheet has its bounds as a sum has. */
function atMost<T extends z.ZodType<object>>(count: number, record: T): T {
  return record.refine((entries) => Object.keys(entries).length <= count, `at most ${count}`);
}

/** Front matter of a question sheet. */
export const sheetSchema = z.strictObject({
  id: z.string().regex(/^[a-z]{2}-[a-z0-9-]{2,40}$/, 'an id is like vd-chart-table'),
  title: line,
  revision: z.string().regex(/^[A-Z]$/, 'a revision is one capital letter'),
  subject: z.enum(Object.keys(SUBJECTS)),
  level: z.enum(['recall', 'apply', 'reason']),
  pool: z.enum(['practice', 'paper']),
  lesson: z.string().regex(/^\d\.\d{1,2}$/, 'a lesson is quoted, like "3.4"'),
  read: line.optional(),
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
  tables: atMost(4, z.record(name, table)).default({}),
  given: atMost(40, z.record(name, given)),
  steps: atMost(40, z.record(name, step)).default({}),
  require: z.array(sum).max(20, 'at most 20').default([]),
  curve: curve.optional(),
  ask: z.record(partId, ask),
  slips: z.array(slip).max(24, 'at most 24').default([]),
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
