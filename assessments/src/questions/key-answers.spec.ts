import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { drawQuestion } from './draw.ts';
import { keyAnswers } from './key-answers.ts';
import { markQuestion } from './mark.ts';
import { parseQuestion } from './sheet.ts';

const file = new URL('../../bank/voltage-drop/vd-chart-table.md', import.meta.url);
const question = parseQuestion(readFileSync(file, 'utf8'), 'vd-chart-table.md');
const drawn = drawQuestion(question, '7c'.repeat(32));

describe('answers made from the key', () => {
  it('gain every mark', () => {
    const marked = markQuestion(question, drawn, keyAnswers(question, drawn));
    expect(marked.marks).toBe(marked.outOf);
  });

  it('slip where asked and carry the slip on', () => {
    const { parts } = markQuestion(question, drawn, keyAnswers(question, drawn, ['a']));
    expect(parts.map(({ verdict }) => verdict)).toEqual([
      'slip',
      'carried-forward',
      'carried-forward',
      'right',
    ]);
  });
});
