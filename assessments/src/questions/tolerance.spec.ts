import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BLANK } from '../../test/answering.ts';
import { smallSheet } from '../../test/small-sheet.ts';
import { type QuantityPart } from './compiled.ts';
import { markQuestion } from './mark.ts';
import { presentQuestion } from './present.ts';
import { isWithin, rangeOf } from './tolerance.ts';
import { workQuestion } from './work.ts';

function part(tolerance: QuantityPart['tolerance']): QuantityPart {
  return {
    id: 'a',
    kind: 'quantity',
    prompt: 'x',
    marks: 1,
    carry: 'none',
    because: '',
    read: null,
    step: 'x',
    units: [],
    tolerance,
    rounding: null,
  };
}

const anyKey = fc.double({ min: -1e6, max: 1e6, noNaN: true });

describe('a tolerance', () => {
  it('as a share takes both edges in and leaves what is beyond out, below nought too', () => {
    fc.assert(
      fc.property(anyKey, fc.double({ min: 1e-4, max: 0.2, noNaN: true }), (key, share) => {
        if (Math.abs(key) < 1e-6) return;
        const range = rangeOf(part({ kind: 'share', share }), key);
        expect(isWithin(key * (1 + share), range)).toBe(true);
        expect(isWithin(key * (1 - share), range)).toBe(true);
        expect(isWithin(key * (1 + share * 1.001), range)).toBe(false);
        expect(isWithin(key * (1 - share * 1.001), range)).toBe(false);
      }),
    );
  });

  it('as a width takes both edges in round any key, nought included', () => {
    fc.assert(
      fc.property(
        fc.oneof(anyKey, fc.constant(0)),
        fc.double({ min: 1e-2, max: 10, noNaN: true }),
        (key, si) => {
          const range = rangeOf(part({ kind: 'plain', si }), key);
          expect(isWithin(key + si, range)).toBe(true);
          expect(isWithin(key - si, range)).toBe(true);
          expect(isWithin(key + si * 1.2, range)).toBe(false);
          expect(isWithin(key - si * 1.2, range)).toBe(false);
        },
      ),
    );
  });

  it('lets no last binary digit push a value over its edge', () => {
    expect(0.1 + 0.2 <= 0.3).toBe(false);
    expect(isWithin(0.1 + 0.2, rangeOf(part({ kind: 'plain', si: 0.1 }), 0.2))).toBe(true);
    expect(isWithin(0.3, rangeOf(part({ kind: 'share', share: 0 }), 0.1 + 0.2))).toBe(true);
  });
});

describe('a rounding rule', () => {
  const rounded = (way: 'up' | 'down' | 'nearest', limit: string): ReturnType<typeof smallSheet> =>
    smallSheet(
      `given:
  limit: { is: Drop allowed, symbol: U, value: ${limit} }
  load: { is: Load, symbol: I, value: 10 A }
  each: { is: "Pair, each metre", symbol: r, value: 10 mΩ/m }
steps:
  longest: { symbol: L, unit: m, is: limit / (load * each), figures: 5 }
ask:
  a:
    find: longest
    units: [m]
    within: exact
    marks: 2
    round: { to: 0.1 m, way: ${way}, say: "to the tenth of a metre, rounded ${way}" }`,
      '## a\n\nHow long may it be?',
    );
  const verdict = (sheet: ReturnType<typeof smallSheet>, text: string): string | undefined =>
    markQuestion(sheet.question, sheet.drawn, { a: { ...BLANK, text, unit: 'm' } }).parts[0]
      ?.verdict;

  it('rounds the key the way it says and marks by the rounded key', () => {
    const down = rounded('down', '0.367 V');
    expect([verdict(down, '3.6'), verdict(down, '3.67'), verdict(down, '3.7')]).toEqual([
      ...['right', 'wrong', 'wrong'],
    ]);
    expect(verdict(rounded('up', '0.362 V'), '3.7')).toBe('right');
    expect(verdict(rounded('up', '0.362 V'), '3.6')).toBe('wrong');
    expect(verdict(rounded('nearest', '0.364 V'), '3.6')).toBe('right');
    expect(verdict(rounded('nearest', '0.366 V'), '3.7')).toBe('right');
  });

  it('moves a key that is round already neither up nor down', () => {
    // 0.3 ÷ 0.1 is 2.9999999999999996 in binary.
    for (const way of ['up', 'down', 'nearest'] as const) {
      expect(verdict(rounded(way, '0.3 V'), '3')).toBe('right');
    }
  });

  it('is said beside the question and is the last worked line', () => {
    const { question, drawn } = rounded('down', '0.367 V');
    expect(presentQuestion(question, drawn).parts[0]?.rounding).toBe(
      'to the tenth of a metre, rounded down',
    );
    const last = workQuestion(question, drawn).parts[0]?.lines.at(-1);
    expect(last?.map(({ text }) => text).join(' ')).toBe(
      'to the tenth of a metre, rounded down = 3.6 m',
    );
  });
});
