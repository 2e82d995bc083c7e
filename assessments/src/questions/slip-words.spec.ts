import { describe, expect, it } from 'vitest';
import { drawQuestion } from './draw.ts';
import { markQuestion } from './mark.ts';
import { parseQuestion } from './sheet.ts';
import { slipWords } from './slip-words.ts';
import { type RawAnswer } from './types.ts';

const SHEET = `---
id: vd-two-slips
title: Two slips
revision: A
subject: VD
level: apply
pool: practice
lesson: "3.4"
profile: metric
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: ["Ohm's law: definition"]
given:
  current: { is: Load, symbol: I, value: 10 A }
  core: { is: Resistance of one core, symbol: R, value: 20 mΩ }
steps:
  fall: { symbol: U_d, unit: V, is: current * core * 2 }
ask:
  a: { find: fall, units: [V], within: 1 %, marks: 2 }
slips:
  - is: You took the square.
    say: once only
    makes: { fall: current * core * 3 }
  - is: You counted the cable out but not back.
    say: out and back
    makes: { fall: current * core }
---

A lamp.

## a

Find the drop.
`;

function traceOf(text: string) {
  const question = parseQuestion(SHEET, 'vd-two-slips.md');
  const answer: RawAnswer = { text, unit: 'V', option: null, working: '' };
  const { trace } = markQuestion(question, drawQuestion(question, 'ab'.repeat(32)), { a: answer });
  return trace.map((entry) => slipWords(question, entry));
}

describe('the words of a slip', () => {
  it('are those of the slip that was recognised', () => {
    expect(traceOf('0.2')).toEqual(['You counted the cable out but not back.']);
    expect(traceOf('0.6')).toEqual(['You took the square.']);
  });

  it('are none where no slip was', () => {
    expect(traceOf('0.4')).toEqual([null]);
    expect(traceOf('9')).toEqual([null]);
  });
});
