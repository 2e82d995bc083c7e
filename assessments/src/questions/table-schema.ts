import { z } from 'zod';
import { figure, line, name, sum, text } from './schema-words.ts';

/** An extract of a printed table; a cell may be empty (`null`). */
export const table = z.strictObject({
  caption: line,
  source: text,
  columns: z
    .record(name, z.strictObject({ is: line, unit: z.string().max(20).default('') }))
    .refine((columns) => Object.keys(columns).length >= 2, 'a table has two columns at least'),
  rows: z
    .array(z.array(figure.nullable()).max(8))
    .min(2, 'a table has two rows at least')
    .max(24, 'an extract has 24 rows at most'),
});

/** The row whose `where` equals the value named by `is`, and what stands there under `column`. */
export const lookUp = z.strictObject({ table: name, column: name, where: name, is: name });

/** A wrong look-up: what it leaves out is as the right one has it. */
const wrongLookUp = z.strictObject({
  'look up': z.strictObject({
    ...lookUp.partial().shape,
    'rows off': z.int().min(-3).max(3).default(0),
  }),
});

export const wrongWay = z.union([sum, wrongLookUp]);

/** A column of a table, as a given is drawn from: "pull.gauge". */
export const columnPath = z
  .string()
  .regex(/^[a-z][A-Za-z0-9]*\.[a-z][A-Za-z0-9]*$/, 'a column is written like pull.gauge');
