import { describe, expect, it } from 'vitest';
import { BLANK } from '../../test/answering.ts';
import { smallSheet } from '../../test/small-sheet.ts';
import { markQuestion } from './mark.ts';

const { question, drawn } = smallSheet(
  `given:
  load: { is: Load, symbol: I, value: 10 A }
  path: { is: Resistance, symbol: R, value: 50 mΩ }
  supply: { is: Supply, symbol: U, value: 12 V }
steps:
  fall: { symbol: U_d, unit: V, is: load * path, says: voltage drop }
  rest: { symbol: U_r, unit: V, is: supply - fall, says: voltage left }
  power: { symbol: P, unit: W, is: rest * load, says: power at the lamp }
  loss: { symbol: P_v, unit: W, is: fall * load }
ask:
  a: { find: power, units: [W], within: 1 %, marks: 1 }
  b: { find: loss, units: [W], within: 1 %, marks: 1 }`,
  '## a\n\nPower?\n\n## b\n\nLoss?',
);

function wrongStep(part: string, text: string, working: string): string | undefined {
  const answer = { ...BLANK, text, unit: 'W', working };
  const marked = markQuestion(question, drawn, { [part]: answer }).parts;
  return marked.find(({ id }) => id === part)?.wrongStep?.symbol;
}

describe('the step that went wrong', () => {
  it.each([
    ['', 'P'],
    ['10 times 50 is 0.5 V', 'U_r'],
    ['500 mV, then 12.5', 'U_r'],
    ['0,5 V; 12 - 0,5 = 11,5', 'P'],
    ['11.5', 'U_d'],
    ['I guessed 77', 'P'],
  ])('with the working %j is %s', (working, symbol) => {
    expect(wrongStep('a', '99', working)).toBe(symbol);
  });

  it('is none where the answer is right, whatever was jotted down', () => {
    expect(wrongStep('a', '115', '0.7')).toBeUndefined();
  });

  it('is the one asked for where it leans on one step more', () => {
    expect(wrongStep('b', '99', '0.5')).toBe('P_v');
  });
});
