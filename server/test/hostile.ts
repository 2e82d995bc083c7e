import fc from 'fast-check';
import { z } from 'zod';

type Schema = Record<string, unknown>;

/** What passes for right: anywhere, and under the name of one field. */
export interface Known {
  readonly values: readonly string[];
  readonly byField: Readonly<Record<string, readonly string[]>>;
}

const nulls = fc.constantFrom('\u0000', 'a\u0000b');
const strings = fc.oneof(
  nulls,
  fc.constantFrom(
    '',
    ' ',
    '\ud800',
    '\u202e\u2066',
    "'; DROP TABLE accounts; --",
    "' OR '1'='1",
    '${7*7}{{7*7}}',
    '<svg onload=alert(1)>',
    '../../../../etc/passwd',
    '%00%2e%2e%2f',
    'A\r\nBcc: x@y.example',
    '__proto__',
    'NaN',
    '1e309',
    '１２３',
    '😀'.repeat(40),
    'x'.repeat(20_000),
  ),
  fc.string({ unit: 'binary', maxLength: 60 }),
);
const numbers = fc.oneof(
  fc.constantFrom(0, -0, -1, 1.5, 2 ** 31, 2 ** 53, -(2 ** 63), 1e308, 5e-324),
  fc.double({ noNaN: true, noDefaultInfinity: true }),
  fc.integer(),
);
const dates = fc.constantFrom(
  '2026-12-01T10:00:00Z',
  '0000-00-00T00:00:00Z',
  '9999-12-31T23:59:59Z',
);

/** Any JSON, with the strings and numbers that have broken programs before. */
const anything: fc.Arbitrary<unknown> = fc.oneof(
  { weight: 3, arbitrary: strings },
  { weight: 1, arbitrary: numbers },
  { weight: 1, arbitrary: fc.constantFrom(null, true, false, [], {}) },
  { weight: 1, arbitrary: fc.jsonValue({ maxDepth: 3 }) },
);

/** Text as a pattern asks for, where the pattern is one that can be drawn from. */
function matching(pattern: unknown): fc.Arbitrary<string> | null {
  if (typeof pattern !== 'string') return null;
  try {
    return fc.stringMatching(new RegExp(pattern, 'u'), { size: 'small' });
  } catch {
    return null;
  }
}

function stringLike(schema: Schema, known: Known): fc.Arbitrary<unknown> {
  const {
    minLength = 0,
    maxLength = 60,
    format,
  } = schema as {
    minLength?: number;
    maxLength?: number;
    format?: string;
  };
  if (format === 'uuid') return fc.oneof(fc.uuid(), fc.constantFrom(...known.values));
  if (format === 'email') return fc.emailAddress();
  if (format === 'date-time') return dates;
  const asWritten = matching(schema['pattern']);
  const text = fc.string({ unit: 'grapheme', minLength, maxLength: Math.min(maxLength, 200) });
  const fitting = known.values.filter(
    ({ length }) => length >= minLength && length <= maxLength && !schema['pattern'],
  );
  const cut = strings.map((hostile) => [...hostile].slice(0, maxLength).join(''));
  return fc.oneof(
    { weight: 3, arbitrary: asWritten ?? text },
    { weight: 1, arbitrary: cut },
    ...(fitting.length > 0 ? [{ weight: 2, arbitrary: fc.constantFrom(...fitting) }] : []),
  );
}

function field(key: string, drawn: fc.Arbitrary<unknown>, known: Known): fc.Arbitrary<unknown> {
  const right = known.byField[key];
  if (!right) return drawn;
  return fc.oneof({ weight: 5, arbitrary: fc.constantFrom(...right) }, drawn);
}

function objectLike(schema: Schema, known: Known): fc.Arbitrary<unknown> {
  const properties = (schema['properties'] ?? {}) as Record<string, Schema>;
  const named = fc.record(
    Object.fromEntries(
      Object.entries(properties).map(([key, of]) => [key, field(key, like(of, known), known)]),
    ),
    { requiredKeys: (schema['required'] ?? []) as string[] },
  );
  const free = schema['additionalProperties'];
  if (typeof free !== 'object' || free === null) return named;
  const keys = fc.oneof(fc.constantFrom('a', 'b', 'c', '__proto__', 'constructor'), strings);
  return fc.dictionary(keys, like(free as Schema, known), { maxKeys: 4 });
}

type Likeness = (schema: Schema, known: Known) => fc.Arbitrary<unknown>;

const byType: Readonly<Record<string, Likeness>> = {
  string: stringLike,
  number: () => numbers,
  integer: () => fc.oneof(fc.integer({ min: 0, max: 40 }), fc.maxSafeInteger()),
  boolean: () => fc.boolean(),
  null: () => fc.constant(null),
  array: (schema, known) =>
    fc.array(like((schema['items'] ?? {}) as Schema, known), { maxLength: 4 }),
  object: objectLike,
};

/** Values of the form a schema asks for, so that they get past it and into the program. */
function like(schema: Schema, known: Known): fc.Arbitrary<unknown> {
  const choices = (schema['anyOf'] ?? schema['oneOf']) as Schema[] | undefined;
  if (choices) return fc.oneof(...choices.map((choice) => like(choice, known)));
  if (Array.isArray(schema['enum'])) return fc.constantFrom(...(schema['enum'] as unknown[]));
  if ('const' in schema) return fc.constant(schema['const']);
  return byType[String(schema['type'])]?.(schema, known) ?? anything;
}

/** A schema with the shared ones it names put in their places. */
function inlined(value: unknown, shared: Record<string, unknown>): unknown {
  if (Array.isArray(value)) return value.map((one) => inlined(one, shared));
  if (typeof value !== 'object' || value === null) return value;
  const named = (value as { $ref?: string }).$ref?.split('/').at(-1);
  if (named !== undefined) return inlined(shared[named] ?? {}, shared);
  return Object.fromEntries(Object.entries(value).map(([key, of]) => [key, inlined(of, shared)]));
}

/** One field made hostile, however deep, or one added. */
function spoil(value: unknown, [at = 0, ...deeper]: number[], hostile: unknown): unknown {
  if (typeof value !== 'object' || value === null) return hostile;
  const keys = [...Object.keys(value), 'roles'];
  const key = keys[at % keys.length] ?? 'roles';
  const inner = (value as Record<string, unknown>)[key];
  return { ...value, [key]: deeper.length > 0 ? spoil(inner, deeper, hostile) : hostile };
}

const spoilt = (body: fc.Arbitrary<unknown>): fc.Arbitrary<unknown> =>
  fc
    .tuple(body, fc.array(fc.nat(), { minLength: 1, maxLength: 3 }), anything)
    .map(([value, path, hostile]) => spoil(value, path, hostile));

/** Bodies for a route: of the right form, almost of it, and of none. */
export function bodiesFor(schema: z.ZodType | null, known: Known): fc.Arbitrary<unknown> {
  if (!schema) return fc.oneof({ weight: 3, arbitrary: fc.constant({}) }, anything);
  const json = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' }) as Schema;
  const right = like(inlined(json, (json['$defs'] ?? {}) as Schema) as Schema, known);
  return fc.oneof(
    { weight: 4, arbitrary: right },
    { weight: 5, arbitrary: spoilt(right) },
    { weight: 1, arbitrary: anything },
  );
}

/** Without halves of characters, which no address can hold. */
export const wellFormed = (text: string): string => Buffer.from(text).toString();

/** Values for a parameter of an address. */
export const paramsFor = (known: readonly string[]): fc.Arbitrary<string> =>
  fc.oneof(
    { weight: 8, arbitrary: fc.constantFrom(...known) },
    { weight: 1, arbitrary: fc.uuid() },
    { weight: 1, arbitrary: strings.map(wellFormed).filter((text) => text !== '') },
  );
