import type {
  Answers as LibraryAnswers,
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
  intervals: z.array(z.object({ label: text, fromH: z.number(), toH: z.number() })),
});

const partSchema = z.object({
  id: text,
  kind: z.enum(['quantity', 'choice']),
  prompt: text,
  marks: z.number(),
  symbol: text.nullable(),
  units: texts,
  rounding: text.nullable(),
  options: z.array(z.object({ id: text, text })),
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

/** One part's answer as it was typed; bounded, since it comes from outside. */
export const rawAnswerSchema = z
  .strictObject({
    text: typed(200),
    unit: typed(20).nullable(),
    option: typed(80).nullable(),
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

/** A marked question. The trace says which rule decided each part: it is shown. */
export const markedQuestionSchema = z
  .object({
    markerVersion: z.number(),
    marks: z.number(),
    outOf: z.number(),
    summary: text,
    parts: z.array(
      z.object({
        id: text,
        prompt: text,
        verdict: z.enum([
          'right',
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
      }),
    ),
    trace: z.array(z.object({ part: text, rule: text, detail: text })),
  })
  .meta({ id: 'MarkedQuestion' }) satisfies z.ZodType<LibraryMarkedQuestion>;

export const workedAnswerSchema = z
  .object({
    title: text,
    lead: text,
    given: z.array(givenSchema),
    diagram: diagramSchema.nullable(),
    curve: curveSchema.nullable(),
    parts: z.array(z.object({ id: text, prompt: text, lines: z.array(lineSchema) })),
  })
  .meta({ id: 'WorkedAnswer' }) satisfies z.ZodType<LibraryWorkedAnswer>;
