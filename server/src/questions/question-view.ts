import type {
  Answers as LibraryAnswers,
  MarkedPart as LibraryMarkedPart,
  MarkedQuestion as LibraryMarkedQuestion,
  QuestionView as LibraryQuestionView,
  Reading as LibraryReading,
  WorkedAnswer as LibraryWorkedAnswer,
} from '@ferrule/assessments';
import { z } from 'zod';

const text = z.string();
const texts = z.array(text);

export const lineSchema = z
  .array(
    z.object({
      kind: z.enum(['symbol', 'number', 'unit', 'operator', 'text']),
      text,
      differs: z.boolean().optional(),
    }),
  )
  .meta({ id: 'Line' });

const givenSchema = z.object({
  symbol: text.nullable(),
  label: text,
  value: text,
  unit: text,
});

const tableSchema = z.object({
  caption: text,
  source: text,
  columns: z.array(z.object({ label: text, unit: text })),
  rows: z.array(texts),
});

/** Questions that were drawn before there were tables have none. */
const tablesSchema = z.array(tableSchema).default([]);

const diagramSchema = z.object({
  kind: z.literal('two-wire-run'),
  labels: z.object({
    source: text,
    fuse: text,
    load: text,
    loadNote: text,
    cable: text,
    length: text,
  }),
  load: z.enum(['lamp', 'motor', 'resistor']),
});

const curveSchema = z.object({
  hours: z.array(z.number()),
  volts: z.array(z.number()),
  amps: z.array(z.number()),
  batteryVolts: z.array(z.number()).optional(),
  inputVolts: z.array(z.number()).optional(),
  batteryAmps: z.array(z.number()).optional(),
  intervals: z.array(z.object({ label: text, fromH: z.number(), toH: z.number() })),
});

export const PART_KINDS = ['quantity', 'choice', 'choices', 'order', 'match'] as const;

const optionsSchema = z.array(z.object({ id: text, text }));

const partSchema = z.object({
  id: text,
  kind: z.enum(PART_KINDS),
  prompt: text,
  marks: z.number(),
  symbol: text.nullable(),
  units: texts,
  rounding: text.nullable(),
  options: optionsSchema,
  rows: optionsSchema.default([]),
  layout: z.enum(['rows', 'sizes']),
});

/** What a person may see before marking. Anything else is dropped on the way out. */
export const questionViewSchema = z
  .object({
    title: text,
    lead: text,
    body: text,
    subject: text,
    profile: z.enum(['metric', 'awg']),
    marks: z.number(),
    aids: texts,
    given: z.array(givenSchema),
    tables: tablesSchema,
    diagram: diagramSchema.nullable(),
    curve: curveSchema.nullable(),
    cautions: z.array(
      z.object({
        level: z.enum(['danger', 'warning', 'caution', 'notice', 'mandatory']),
        title: text,
        text,
      }),
    ),
    parts: z.array(partSchema),
  })
  .meta({ id: 'QuestionView' }) satisfies z.ZodType<LibraryQuestionView>;
export type QuestionView = z.infer<typeof questionViewSchema>;

/** Text that the database can keep: no NUL, no half of a character pair. */
const typed = (most: number) =>
  z
    .string()
    .max(most)
    .regex(/^[^\0\p{Surrogate}]*$/u, 'holds characters that cannot be kept');

const MOST_OPTIONS = 20;

/** One part's answer as it was typed; bounded, since it comes from outside. */
export const rawAnswerSchema = z
  .strictObject({
    text: typed(200),
    unit: typed(20).nullable(),
    option: typed(80).nullable(),
    options: z.array(typed(80)).max(MOST_OPTIONS, `at most ${MOST_OPTIONS} choices`).optional(),
    working: typed(2_000),
  })
  .meta({ id: 'RawAnswer' });

const partIdSchema = z.string().regex(/^[a-z0-9-]{1,20}$/);

const MOST_PARTS = 20;

/** Answers by part id. */
export const answersSchema = z
  .record(partIdSchema, rawAnswerSchema)
  .refine((answers) => Object.keys(answers).length <= MOST_PARTS, {
    message: `at most ${MOST_PARTS} parts`,
  }) satisfies z.ZodType<LibraryAnswers>;
export type Answers = z.infer<typeof answersSchema>;

export const readingSchema = z
  .discriminatedUnion('state', [
    z.object({ state: z.literal('blank') }),
    z.object({ state: z.literal('understood'), value: z.number().nullable(), shown: text }),
    z.object({ state: z.literal('ambiguous'), ask: text, readings: texts }),
    z.object({ state: z.literal('not-understood'), ask: text }),
  ])
  .meta({ id: 'Reading' }) satisfies z.ZodType<LibraryReading>;
export type Reading = z.infer<typeof readingSchema>;

/** What to read after an answer that was not right. */
const readAgainSchema = z
  .object({
    /** Number of the sheet. */
    sheet: text,
    /** Null while the sheet is not issued. */
    title: text.nullable(),
    heading: text.nullable(),
    /** Number of the paragraph under the heading. */
    paragraph: z.number().nullable(),
    issued: z.boolean(),
  })
  .meta({ id: 'ReadAgain' });
export type ReadAgain = z.infer<typeof readAgainSchema>;

const markedPartSchema = z.object({
  id: text,
  prompt: text,
  verdict: z.enum([
    'right',
    'partly-right',
    'carried-forward',
    'slip',
    'wrong-unit',
    'power-of-ten',
    'wrong',
    'blank',
    'not-understood',
    'not-carried',
  ]),
  marks: z.number(),
  outOf: z.number(),
  yours: z.array(lineSchema),
  worked: z.array(lineSchema),
  remarks: z.array(
    z.object({ sign: z.enum(['gained', 'lost', 'note']), heading: text.nullable(), text }),
  ),
  /** Null where no step went wrong, and in markings kept before it was told. */
  wrongStep: z.object({ symbol: text, says: text }).nullable().default(null),
  read: readAgainSchema.nullable(),
});

/** The library names a heading; people are told sheet and paragraph. */
type ShownMarkedQuestion = Omit<LibraryMarkedQuestion, 'parts'> & {
  parts: (Omit<LibraryMarkedPart, 'read'> & { read: ReadAgain | null })[];
};

/** A marked question. The trace says which rule decided each part: it is shown. */
export const markedQuestionSchema = z
  .object({
    markerVersion: z.number(),
    marks: z.number(),
    outOf: z.number(),
    summary: text,
    parts: z.array(markedPartSchema),
    trace: z.array(z.object({ part: text, rule: text, detail: text })),
  })
  .meta({ id: 'MarkedQuestion' }) satisfies z.ZodType<ShownMarkedQuestion>;
export type MarkedQuestion = z.infer<typeof markedQuestionSchema>;

export const workedAnswerSchema = z
  .object({
    title: text,
    lead: text,
    given: z.array(givenSchema),
    tables: tablesSchema,
    diagram: diagramSchema.nullable(),
    curve: curveSchema.nullable(),
    parts: z.array(z.object({ id: text, prompt: text, lines: z.array(lineSchema) })),
  })
  .meta({ id: 'WorkedAnswer' }) satisfies z.ZodType<LibraryWorkedAnswer>;
