import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { workingTimeMs } from '../../test/working-time.ts';
import { dimensionOf, outcomeOf } from './dimensions.ts';
import { compile, evaluate, NotFinite } from './evaluate.ts';
import { type Expr, ExpressionRefused, readExpression } from './expression.ts';
import { refusalOf } from './names.ts';
import { parseUnit } from './unit-expression.ts';

const NAMES = new Set(['supply', 'load', 'run', 'area', 'count']);
const DIMENSIONS = new Map(
  Object.entries({ supply: 'V', load: 'A', run: 'm', area: 'mm²', count: '' }).map(
    ([name, unit]) => [name, parseUnit(unit).dimension] as const,
  ),
);
const VALUES = new Map([
  ['supply', 12],
  ['load', 20],
  ['run', 5],
  ['area', 10e-6],
  ['count', 3],
]);

const read = (text: string): Expr => readExpression(text, NAMES);
const work = (text: string): number => evaluate(compile(read(text), 'metric'), VALUES, text);

describe('expressions', () => {
  it.each([
    ['supply / load', 0.6],
    ['supply - load * 0.1', 10],
    ['(supply - 2) * count', 30],
    ['-count ^ 2', -9],
    ['(-count) ^ 2', 9],
    ['2 ^ 3 ^ 2', 512],
    ['supply / 2 / 3', 2],
    ['supply > 10 ? 1 : 2', 1],
    ['supply < 10 ? 1 : supply < 11 ? 2 : 3', 3],
    ['sqrt(count * 12)', 6],
    ['max(count, 2, 7)', 7],
    ['min(count, 2)', 2],
    ['ln(1)', 0],
    ['abs(2 - count)', 1],
    ['tableOhms(area) * run', 0.00955],
    ['nextCable(area)', 10e-6],
    ['cableForDrop(load, run, supply * 0.03)', 16e-6],
    ['nextFuse(load / 0.8)', 25],
    ['groupingFactor(count)', 0.7],
  ])('works %s', (text, value) => {
    expect(work(text)).toBeCloseTo(value, 12);
  });

  it('agrees with plain arithmetic on any sum of the four kinds', () => {
    const leaf = fc.constantFrom('supply', 'load', 'run', 'count', '2', '0.5');
    const sum = fc.letrec<{ node: string }>((tie) => ({
      node: fc.oneof(
        { maxDepth: 4, withCrossShrink: true },
        leaf,
        fc
          .tuple(tie('node'), fc.constantFrom('+', '-', '*', '/'), tie('node'))
          .map(([a, op, b]) => `(${a} ${op} ${b})`),
      ),
    })).node;
    fc.assert(
      fc.property(sum, (text) => {
        if (text.length > 300) return;
        const js = text.replace(/[a-z]+/g, (name) => String(VALUES.get(name)));
        // The oracle: arithmetic spelled out as nested calls, worked on the same digits.
        const expected = workByHand(js);
        const found = compile(read(text), 'metric')(VALUES);
        if (Number.isFinite(expected)) expect(found).toBeCloseTo(expected, 9);
        else expect(Number.isFinite(found)).toBe(false);
      }),
      { numRuns: 300 },
    );
  });

  it('is an error where it comes to no finite number', () => {
    expect(() => work('supply / (count - 3)')).toThrow(NotFinite);
    expect(() => work('ln(0 - count)')).toThrow(NotFinite);
    expect(() => work('10 ^ 400')).toThrow(NotFinite);
  });
});

/** Fully bracketed sums only: split at the operator of the outermost bracket. */
function workByHand(text: string): number {
  if (!text.startsWith('(')) return Number(text);
  let depth = 0;
  for (let at = 1; at < text.length - 1; at += 1) {
    if (text[at] === '(') depth += 1;
    if (text[at] === ')') depth -= 1;
    if (depth !== 0 || text[at] !== ' ') continue;
    const left = workByHand(text.slice(1, at));
    const right = workByHand(text.slice(at + 3, -1));
    if (text[at + 1] === '+') return left + right;
    if (text[at + 1] === '-') return left - right;
    return text[at + 1] === '*' ? left * right : left / right;
  }
  return NaN;
}

describe('hostile expressions', () => {
  const deep = `${'('.repeat(120)}1${')'.repeat(120)}`;
  const hostile = [
    '1:1000000000',
    'sum(1:1e9)',
    'count = 5',
    'f(x) = x',
    'supply; load',
    'supply\nload',
    '[1, 2, 3]',
    '{a: 1}',
    '"text"',
    "'text'",
    '`text`',
    'supply[1]',
    'supply.constructor',
    'supply.constructor("return process")()',
    'cos.constructor("return 1")()',
    'import({a: 1})',
    'createUnit("x")',
    'evaluate("1+1")',
    'parse("1")',
    'simplify("x")',
    'derivative("x", "x")',
    'constructor',
    '__proto__',
    'toString()',
    'hasOwnProperty(1)',
    'count!',
    "count'",
    'count % 2',
    'supply and load',
    'not supply',
    'supply xor load',
    '~count',
    'count | 1',
    'count & 1',
    'count << 2',
    'count >> 2',
    'count >>> 2',
    '5 mm',
    '2 load',
    '2(3)',
    '(2)(3)',
    'load to mA',
    'load in mA',
    'i',
    'pi',
    'e',
    'Infinity',
    'NaN',
    'null',
    'true',
    'undefined',
    '0x10',
    '0b11',
    '1e999',
    '3 < count < 5',
    'zeros(100000)',
    'ones(9999, 9999)',
    'random()',
    'factorial(170)',
    'gamma(5)',
    'combinations(100, 50)',
    'bignumber(1)',
    'fraction(1)',
    'unit(5, 1)',
    'sqrt()',
    'sqrt(1, 2)',
    'min(1)',
    'tableOhms()',
    '',
    '   ',
    '1 +',
    '(1',
    '1)',
    '?',
    '1 ? 2',
    ':',
    ',',
    '.',
    '#comment',
    '$',
    '@',
    '\\',
    '1' + '+1'.repeat(120),
    '9^'.repeat(60) + '9',
    deep,
    '('.repeat(299),
    '-'.repeat(250) + '1',
    'sqrt('.repeat(40) + '4' + ')'.repeat(40),
    '1?'.repeat(60) + '1',
    'x'.repeat(5000),
    '1'.repeat(301),
    '(((((('.repeat(1000),
  ];

  it.each(hostile)('refuses %j', (text) => {
    const refuse = (): void => expect(() => read(text)).toThrow(ExpressionRefused);
    expect(workingTimeMs(refuse)).toBeLessThan(50);
  });

  it('refuses or works anything of the allowed letters, and never hangs', () => {
    const pieces = 'supply load sqrt( max( ( ) + - * / ^ < == ? : , . 1 9e9 ! = tableOhms('.split(
      ' ',
    );
    const letters = fc.constantFrom(...pieces, ' ');
    fc.assert(
      fc.property(fc.array(letters, { maxLength: 60 }), (written) => {
        const tryIt = (): void => {
          try {
            work(written.join(''));
          } catch (error) {
            const known = ['ExpressionRefused', 'NotFinite', 'OutOfRange'];
            expect(known).toContain((error as Error).name);
          }
        };
        expect(workingTimeMs(tryIt)).toBeLessThan(50);
      }),
      { numRuns: 500 },
    );
  });
});

describe('dimensions', () => {
  const unitOf = (text: string): readonly number[] => dimensionOf(read(text), DIMENSIONS);

  it.each([
    ['supply / load', 'Ω'],
    ['supply * load', 'W'],
    ['tableOhms(area) * run * load', 'V'],
    ['sqrt(supply ^ 2 - 4 * supply * supply)', 'V'],
    ['area ^ 0.5', 'm'],
    ['supply > 10 * supply ? load : load * 2', 'A'],
    ['max(load, 2 * load)', 'A'],
    ['supply / supply', ''],
    ['nextCable(area)', 'm²'],
  ])('finds that %s is in %s', (text, unit) => {
    expect(unitOf(text)).toEqual(parseUnit(unit).dimension);
  });

  it.each([
    ['supply + load', 'Units do not match'],
    ['supply - supply + load', 'Units do not match'],
    ['supply - supply + 1', 'Units do not match'],
    ['supply > load ? run : area', 'Units do not match'],
    ['supply > 1 ? run : run', 'Units do not match'],
    ['count > 1 ? run : area', 'Units do not match'],
    ['max(load, supply)', 'Units do not match'],
    ['tableOhms(run)', 'takes m^2 as argument 1, not m'],
    ['ln(supply)', 'takes a pure number'],
    ['supply ^ count', 'exponent must be a number written out'],
    ['(supply > load * 1) + 1', 'do not match'],
    ['1 + (count > 1)', 'A comparison stands where a quantity is wanted'],
    ['count ? 1 : 2', 'What stands before ? must be a comparison'],
  ])('refuses %s', (text, message) => {
    expect(() => unitOf(text)).toThrow(message);
  });

  it('tells a condition from a quantity', () => {
    expect(outcomeOf(read('load > 2 * load'), DIMENSIONS)).toEqual({ kind: 'condition' });
  });
});

describe('practice', () => {
  it('decides which stock a function steps up to', () => {
    const scope = new Map([['area', 10e-6]]);
    const next = (practice: 'metric' | 'awg'): number =>
      evaluate(compile(read('nextCable(area)'), practice), scope, 'nextCable');
    expect(next('metric')).toBe(10e-6);
    // 6 AWG by ASTM B258.
    expect(next('awg') * 1e6).toBeCloseTo(13.3017679, 6);
  });
});

describe('names', () => {
  it.each(['A', 'm', 'h', 'V', 'pi', 'e', 'i', 'tau', 'mm', 'metre', 'kilo', 'drop', 'hours'])(
    'may not be %s, a unit, prefix or constant',
    (name) => {
      expect(refusalOf(name)).toContain('a unit, prefix or constant');
    },
  );

  it.each(['sqrt', 'rating', 'constructor', 'toString'])('may not be %s, a function', (name) => {
    expect(refusalOf(name)).toContain('a function');
  });

  it.each(['supply', 'load', 'run', 'area', 'pair'])('may be %s', (name) => {
    expect(refusalOf(name)).toBeNull();
  });
});
