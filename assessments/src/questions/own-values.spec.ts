import { describe, expect, it } from 'vitest';
import { BLANK } from '../../test/answering.ts';
import { smallSheet } from '../../test/small-sheet.ts';
import { judgeQuestion } from './judge-question.ts';

const FRONT = `given:
  load: { is: Load, symbol: I, value: 100 A }
steps:
  heavier: { symbol: I_h, unit: A, is: load * 2 }
  double: { symbol: I_d, unit: A, is: heavier * 2 }
  fuse: { symbol: I_f, unit: A, is: nextFuse(heavier) }
ask:
  a: { find: heavier, units: [A], within: 1 %, marks: 1 }
  b: { find: double, units: [A], within: 1 %, marks: 2, carry: own }
  c: { find: fuse, units: [A], within: exact, marks: 1, carry: own }`;
const SECTIONS = ['a', 'b', 'c'].map((letter) => `## ${letter}\n\nFind it.\n`).join('\n');

describe('sums on own earlier values', () => {
  const { question, drawn } = smallSheet(FRONT, SECTIONS);
  const verdicts = (a: string, b: string, c: string): string[] => {
    const typed = (text: string) => ({ ...BLANK, text, unit: 'A' });
    const answers = { a: typed(a), b: typed(b), c: typed(c) };
    return judgeQuestion(question, drawn, answers).parts.map(({ verdict }) => verdict);
  };

  it('are carried forward', () => {
    expect(verdicts('73', '146', '80')).toEqual(['wrong', 'carried-forward', 'carried-forward']);
  });

  it('are carried forward though they lead a later step out of its table', () => {
    expect(verdicts('73000', '146000', '1')).toEqual(['wrong', 'carried-forward', 'wrong']);
  });
});
