import { describe, expect, it } from 'vitest';
import { answerRight, BLANK, choose } from '../../test/answering.ts';
import { openSheetNamed, seedNumber } from '../../test/bank-files.ts';
import { smallSheet } from '../../test/small-sheet.ts';
import { type Drawn } from './compiled.ts';
import { drawQuestion } from './draw.ts';
import { markQuestion } from './mark.ts';
import { presentQuestion } from './present.ts';
import { type Line } from './types.ts';
import { workQuestion } from './work.ts';

const read = (lines: Line[] | undefined): string[] =>
  (lines ?? []).map((line) => line.map(({ text }) => text).join(' '));

function workedLine(is: string, unit: string): string[] {
  const { question, drawn } = smallSheet(
    `given:
  supply: { is: Supply, symbol: U, value: 12 V }
  load: { is: Load, symbol: I, value: 4 A }
  other: { is: Other, symbol: I_2, value: 2 A }
  count: { is: Lamps, symbol: n, value: 3 }
  hot: { is: Air, symbol: T, value: -5 °C }
  cold: { is: Zero, value: 0 °C, shown: false }
steps:
  result: { symbol: x, unit: "${unit}", is: "${is}" }
ask:
  a: { find: result, units: [${unit}], within: 1 %, marks: 1 }`,
    '## a\n\nFind it.',
  );
  return read(workQuestion(question, drawn).parts[0]?.lines);
}

describe('worked lines', () => {
  it.each([
    ['supply / load', 'Ω', ['x = U ÷ I', '= 12 V ÷ 4 A', '= 3 Ω']],
    ['2 * load + other', 'A', ['x = 2 I + I_2', '= 2 × 4 A + 2 A', '= 10 A']],
    ['(load + other) * 2', 'A', ['x = ( I + I_2 ) × 2', '= ( 4 A + 2 A ) × 2', '= 12 A']],
    ['supply / (load + other)', 'Ω', ['x = U ÷ ( I + I_2 )', '= 12 V ÷ ( 4 A + 2 A )', '= 2 Ω']],
    ['load - (other - load)', 'A', ['x = I − ( I_2 − I )', '= 4 A − ( 2 A − 4 A )', '= 6 A']],
    ['load ^ 2 / load', 'A', ['x = I ² ÷ I', '= ( 4 A ) ² ÷ 4 A', '= 4 A']],
    ['sqrt(load * load)', 'A', ['x = √ ( I × I )', '= √ ( 4 A × 4 A )', '= 4 A']],
    ['max(load, other)', 'A', ['x = the larger of I , I_2', '= the larger of 4 A , 2 A', '= 4 A']],
    ['cold - hot', 'K', ['x = 0 °C − T', '= 0 °C − ( −5 °C )', '= 5 K']],
    ['-load + other', 'A', ['x = − I + I_2', '= − 4 A + 2 A', '= −2 A']],
    [
      'count > 2 ? load : other',
      'A',
      ['x = I if n > 2 or else I_2', '= 4 A if 3 > 2 or else 2 A', '= 4 A'],
    ],
  ])('sets out %s', (is, unit, lines) => {
    expect(workedLine(is, unit)).toEqual(lines);
  });

  it('come to the very figure the marker takes, on every step', () => {
    const question = openSheetNamed('rd-trailer-loom');
    const drawn = drawQuestion(question, seedNumber(9)) as Drawn;
    const worked = workQuestion(question, drawn);
    const right = markQuestion(question, drawn, answerRight(question, drawn));
    expect(right.parts.map(({ worked: lines }) => read(lines))).toEqual(
      worked.parts.map(({ lines }) => read(lines)),
    );
  });

  it('print a step once, for the first part that needs it', () => {
    const question = openSheetNamed('vd-winch-pump');
    const drawn = drawQuestion(question, seedNumber(2)) as Drawn;
    const firsts = workQuestion(question, drawn).parts.flatMap(({ lines }) => read(lines));
    expect(firsts.filter((line) => line.startsWith('A_I ='))).toHaveLength(1);
  });
});

describe('a figure read off a curve', () => {
  it('stands alone in own lines, and is sent back to the curve when it is wrong', () => {
    const question = openSheetNamed('cc-read-agm');
    const drawn = drawQuestion(question, seedNumber(4)) as Drawn;
    const typed = (text: string, unit: string): typeof BLANK => ({ ...BLANK, text, unit });
    const slip = String(drawn.values.limit);
    const marked = markQuestion(question, drawn, { d: typed('0.2', 'h'), f: typed(slip, 'A') });
    const [d, f] = ['d', 'f'].map((id) => marked.parts.find((part) => part.id === id));
    expect(read(d?.yours)).toEqual(['t_1 = 0.2 h']);
    expect(d?.remarks[0]?.text).toContain('read it again: Bulk ends where the voltage reaches');
    expect(f?.verdict).toBe('slip');
    expect(read(f?.yours)).toEqual([`I_r = ${slip} A`]);
    expect(f?.worked[0]?.some((token) => token.differs)).toBe(false);
  });
});

describe('options', () => {
  const question = openSheetNamed('cc-never-ends');
  const drawn = drawQuestion(question, seedNumber(3)) as Drawn;
  const { parts } = presentQuestion(question, drawn);
  const pick = (id: string, text: string): string =>
    parts.find((part) => part.id === id)?.options.find((one) => one.text.startsWith(text))?.id ??
    '';

  it('each have their reason when they are wrong', () => {
    for (const [id, text] of [
      ['f', 'The battery is faulty'],
      ['f', 'The charger is too small'],
      ['g', 'Raise the tail'],
      ['c', 'Float'],
    ] as const) {
      const marked = markQuestion(question, drawn, { [id]: choose(pick(id, text)) });
      const part = marked.parts.find((one) => one.id === id);
      expect(part?.verdict).toBe('wrong');
      expect(part?.remarks[0]?.text.length).toBeGreaterThan(20);
      expect(read(part?.yours)[0]).toContain(text);
    }
  });

  it('judge a verdict on the true rating, whatever was worked out before', () => {
    const chain = openSheetNamed('rd-chain');
    for (let n = 0; n < 200; n += 1) {
      const paper = drawQuestion(chain, seedNumber(n)) as Drawn;
      const { spare = 0 } = paper.values;
      if (spare > -4) continue;
      // Own rating far too high: on it the cable would carry the load.
      const view = presentQuestion(chain, paper);
      const yes = view.parts[4]?.options.find((one) => one.text === 'It carries the load');
      const answers = {
        d: { ...BLANK, text: String(-spare), unit: 'A' },
        e: choose(yes?.id ?? ''),
      };
      const verdict = markQuestion(chain, paper, answers).parts[4];
      expect(verdict?.verdict).toBe('not-carried');
      expect(verdict?.remarks[0]?.heading).toBe('Not carried forward');
      return;
    }
    throw new Error('No draw fell short.');
  });
});
