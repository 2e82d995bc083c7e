import { describe, expect, it } from 'vitest';
import { ELECTRICAL } from '../../test/typed-answers/electrical.ts';
import { MEASURES } from '../../test/typed-answers/measures.ts';
import { NUMBERS } from '../../test/typed-answers/numbers.ts';
import { type TypedAnswer } from '../../test/typed-answers/typed-answers.ts';
import { workingTimeMs } from '../../test/working-time.ts';
import { readAnswer } from './read-answer.ts';
import { type PartView, type RawAnswer } from './types.ts';

function part(...units: string[]): PartView {
  return {
    id: 'a',
    kind: 'quantity',
    prompt: '',
    marks: 1,
    symbol: 'x',
    units,
    rounding: null,
    options: [],
    rows: [],
    layout: 'rows',
  };
}

function typed(text: string, unit: string | null = null): RawAnswer {
  return { text, unit, option: null, working: '' };
}

const TABLE = [...NUMBERS, ...ELECTRICAL, ...MEASURES];

function checkAnswer(units: string[], [text, meaning, shown]: TypedAnswer): void {
  const reading = readAnswer(part(...units), typed(text, units[0] ?? null));
  if (typeof meaning === 'number') {
    expect(reading).toMatchObject({ state: 'understood', shown });
    const value = reading.state === 'understood' ? (reading.value ?? NaN) : NaN;
    expect(Math.abs(value - meaning)).toBeLessThanOrEqual(1e-7 * Math.abs(meaning));
  } else if (Array.isArray(meaning)) {
    expect(reading).toMatchObject({ state: 'ambiguous', readings: meaning });
  } else {
    expect(reading.state).toBe(meaning === 'no' ? 'not-understood' : 'blank');
  }
}

describe.each(TABLE)('what people type for $asked', ({ units, answers }) => {
  it.each(answers.map((answer) => [answer[0], answer] as const))('%j', (_text, answer) =>
    checkAnswer(units, answer),
  );
});

describe('reading an answer', () => {
  it('asks back with both readings of a lone comma before three digits', () => {
    expect(readAnswer(part('mΩ'), typed('1,234', 'mΩ'))).toEqual({
      state: 'ambiguous',
      ask: 'Did you mean 1.234 or 1234? Type it without a mark between thousands.',
      readings: ['1.234', '1234'],
    });
    expect(readAnswer(part('s', 'min'), typed('1:30', 's'))).toMatchObject({
      ask: 'Did you mean 1 h 30 min or 1 min 30 s? Type it with its units.',
    });
  });

  it('shows back what it understood, in the unit it was given in', () => {
    const shown = (text: string, unit: string | null): string => {
      const reading = readAnswer(part('mΩ', 'Ω'), typed(text, unit));
      return reading.state === 'understood' ? reading.shown : reading.state;
    };
    expect(shown('48,1', 'mΩ')).toBe('48.1 mΩ');
    expect(shown('0.0481', 'Ω')).toBe('0.0481 Ω');
    expect(shown('48.10 milliohm', 'Ω')).toBe('48.1 mΩ');
    expect(shown('-3', 'Ω')).toBe('\u22123 Ω');
  });

  it('asks for the unit where several are offered and none is given', () => {
    expect(readAnswer(part('mΩ', 'Ω'), typed('48.1'))).toEqual({
      state: 'not-understood',
      ask: 'Which unit is it in? Give mΩ or Ω.',
    });
    expect(readAnswer(part('V'), typed('0.674'))).toMatchObject({ state: 'understood' });
  });

  it('says what a unit of another kind is wrong about', () => {
    expect(readAnswer(part('V', 'mV'), typed('3 A'))).toEqual({
      state: 'not-understood',
      ask: 'A measures something else than this part asks for; give it in V or mV.',
    });
    expect(readAnswer(part('V'), typed('3 parsecs'))).toEqual({
      state: 'not-understood',
      ask: '"parsecs" is not a unit we know; give it in V.',
    });
  });

  it('reads an option by its id and refuses one of another paper', () => {
    const choice: PartView = {
      ...part(),
      kind: 'choice',
      options: [{ id: 'k3f9', text: 'Bulk' }],
    };
    const chosen = (option: string | null): RawAnswer => ({ ...typed('ignored'), option });
    expect(readAnswer(choice, chosen('k3f9'))).toEqual({
      state: 'understood',
      value: null,
      shown: 'Bulk',
    });
    expect(readAnswer(choice, chosen(null))).toEqual({ state: 'blank' });
    expect(readAnswer(choice, chosen('other'))).toMatchObject({ state: 'not-understood' });
  });

  it('takes long or hostile text in no time and without throwing', () => {
    const hostile = [
      `${'1 V '.repeat(14)}dc`,
      `1 ${'per '.repeat(14)}`,
      `1 ${'m/'.repeat(28)}`,
      '9'.repeat(5000),
      ' '.repeat(5000) + 'x',
      '1,'.repeat(2000),
      '1 000'.repeat(900),
    ];
    for (const text of [
      ...hostile,
      '__proto__',
      'constructor',
      '1 constructor',
      '\u0000',
      '1e-99999',
    ]) {
      const readIt = (): void =>
        expect(readAnswer(part('V'), typed(text)).state).not.toBe('understood');
      expect(workingTimeMs(readIt)).toBeLessThan(50);
    }
  });
});
