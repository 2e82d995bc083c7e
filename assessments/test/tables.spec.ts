import { describe, expect, it } from 'vitest';
import { type Drawn } from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { keyAnswers } from '../src/questions/key-answers.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { presentQuestion } from '../src/questions/present.ts';
import { readAnswer } from '../src/questions/read-answer.ts';
import { hintFor } from '../src/questions/hint.ts';
import { type Line } from '../src/questions/types.ts';
import { workQuestion } from '../src/questions/work.ts';
import { BLANK, choose } from './answering.ts';
import { seedNumber } from './bank-files.ts';
import { smallSheet } from './small-sheet.ts';

// Figures made up for the test: a pull that is another in every row.
const { question } = smallSheet(
  `tables:
  pull:
    caption: Least pull on a crimp
    source: made up
    columns: { gauge: { is: Gauge, unit: AWG }, force: { is: Least pull, unit: N }, hold: { is: Hold, unit: s } }
    rows: [[6, 600, 60], [4, 800, 61], [2, 900, 62], [1/0, 1200, null], [-3, 1500, 64]]
given:
  size: { is: Gauge, symbol: n, column: pull.gauge }
  area: { is: Wanted, symbol: A, from: 9 mm², to: 12 mm², step: 1 mm² }
steps:
  force: { symbol: F, unit: N, look up: { table: pull, column: force, where: gauge, is: size } }
  twice: { symbol: F_2, unit: kN, is: 2 * force }
  gauge: { symbol: n_2, unit: AWG, is: nextGauge(area) }
ask:
  a: { find: force, units: [N, kN], within: exact, marks: 2 }
  b: { find: twice, units: [kN, N], within: 1 %, marks: 1, carry: own }
  c: { size: gauge, stock: gauge, from: 8, to: 1/0, marks: 1 }
  d: { find: gauge, units: [AWG], within: exact, marks: 1 }
slips:
  - { is: You read a row too high., say: go to the row of {size}, makes: { force: { look up: { rows off: -1 } } } }
  - { is: You read the gauge., say: the pull is in the next column, makes: { gauge: size } }`.replace(
    'go to the row of {size}',
    "'go to the row of {size}'",
  ),
  '## a\n\nPull?\n\n## b\n\nTwice?\n\n## c\n\nGauge?\n\n## d\n\nWhich gauge?',
);

function drawOf(size: number): Drawn {
  for (let n = 0; n < 400; n += 1) {
    const drawn = drawQuestion(question, seedNumber(n)) as Drawn;
    if (drawn.values.size === size) return drawn;
  }
  throw new Error(`No draw of gauge ${size}.`);
}

const text = (line: Line | null | undefined): string =>
  (line ?? []).map((token) => token.text).join(' ');
const lines = (all: Line[] | undefined): string[] => (all ?? []).map(text);

describe('a table extract', () => {
  const drawn = drawOf(0);

  it('is printed with the question and its worked answer, gauges by their names', () => {
    const { tables, given } = presentQuestion(question, drawn);
    expect(tables).toEqual([
      {
        caption: 'Least pull on a crimp',
        source: 'made up',
        columns: [
          { label: 'Gauge', unit: 'AWG' },
          { label: 'Least pull', unit: 'N' },
          { label: 'Hold', unit: 's' },
        ],
        rows: [
          ['6', '600', '60'],
          ['4', '800', '61'],
          ['2', '900', '62'],
          ['1/0', '1200', '–'],
          ['4/0', '1500', '64'],
        ],
      },
    ]);
    expect(workQuestion(question, drawn).tables).toEqual(tables);
    expect(given[0]).toMatchObject({ value: '1/0', unit: 'AWG' });
  });

  it('is looked up in a worked line', () => {
    const [a] = workQuestion(question, drawn).parts;
    expect(lines(a?.lines)).toEqual([
      'F = row n , column Least pull',
      '= row 1/0 AWG , column Least pull',
      '= 1200 N',
    ]);
    expect(text(hintFor(question, drawn, 'a'))).toBe('F = row n , column Least pull');
  });

  it('is known to be read a row too high, and the slip carries on', () => {
    const marked = markQuestion(question, drawn, keyAnswers(question, drawn, ['a']));
    expect(marked.parts.map(({ verdict }) => verdict).slice(0, 2)).toEqual([
      'slip',
      'carried-forward',
    ]);
    expect(lines(marked.parts[0]?.yours)).toEqual([
      'F = the row above n , column Least pull',
      '= the row above 1/0 AWG , column Least pull',
      '= 900 N',
    ]);
    expect(marked.parts[0]?.remarks.at(-1)?.text).toBe('go to the row of 1/0\u00a0AWG');
  });

  it('has no slip above its first row', () => {
    const held = drawOf(6).parts.a;
    expect(held?.kind === 'quantity' && held.slips).toEqual([]);
  });

  it('draws every row', () => {
    const sizes = new Set<number>();
    for (let n = 0; n < 100; n += 1) {
      sizes.add((drawQuestion(question, seedNumber(n)) as Drawn).values.size ?? NaN);
    }
    expect([...sizes].toSorted((a, b) => a - b)).toEqual([-3, 0, 2, 4, 6]);
  });
});

describe('a gauge as an answer', () => {
  const drawn = drawOf(2);
  const { parts } = presentQuestion(question, drawn);
  const { gauge = NaN } = drawn.values;

  it('is chosen from a row of gauges, thinnest first', () => {
    expect(parts[2]?.options.map(({ text: size }) => size)).toEqual([
      ...['8 AWG', '6 AWG', '4 AWG', '3 AWG', '2 AWG', '1 AWG', '1/0 AWG'],
    ]);
    const right = parts[2]?.options.find(({ text: size }) => size === `${gauge} AWG`);
    const marked = markQuestion(question, drawn, { c: choose(right?.id ?? '') });
    expect(marked.parts[2]).toMatchObject({ verdict: 'right', marks: 1 });
  });

  it.each([
    ['1/0', 0, '1/0 AWG'],
    ['2/0 AWG', -1, '2/0 AWG'],
    ['10', 10, '10 AWG'],
    ['#8', 8, '8 AWG'],
    ['6 awg', 6, '6 AWG'],
  ])('is read from %j', (typed, value, shown) => {
    const part = parts[3];
    if (!part) throw new Error('No part d.');
    const reading = readAnswer(part, { ...BLANK, text: typed, unit: 'AWG' });
    expect(reading).toEqual({ state: 'understood', value, shown });
  });

  it('ten times out is no power of ten', () => {
    const answer = { ...BLANK, text: String(gauge * 10), unit: 'AWG' };
    expect(markQuestion(question, drawn, { d: answer }).parts[3]?.verdict).toBe('wrong');
  });
});

describe('a slip in the column', () => {
  it('takes from the right look-up what it does not name', () => {
    const { question: other } = smallSheet(
      `tables:
  rated:
    caption: Rating
    source: made up
    columns: { area: { is: Cable, unit: mm² }, cool: { is: 30 °C, unit: A }, hot: { is: 50 °C, unit: A } }
    rows: [[6, 60, 51], [10, 80, 68], [16, 120, 102]]
given:
  area: { is: Cable, symbol: A, column: rated.area }
steps:
  carries: { symbol: I_z, unit: A, look up: { table: rated, column: hot, where: area, is: area } }
ask:
  a: { find: carries, units: [A], within: exact, marks: 1 }
slips:
  - { is: You read the cool column., say: read 50 °C, makes: { carries: { look up: { column: cool } } } }`,
      '## a\n\nRating?',
    );
    const drawn = drawQuestion(other, seedNumber(1));
    const marked = markQuestion(other, drawn, keyAnswers(other, drawn, ['a']));
    expect(marked.parts[0]?.verdict).toBe('slip');
    expect(lines(marked.parts[0]?.yours)[0]).toBe('I_z = row A , column 30 °C');
    const differs = marked.parts[0]?.worked[0]?.filter((token) => token.differs);
    expect(differs?.map((token) => token.text)).toEqual(['column 50 °C']);
  });
});
