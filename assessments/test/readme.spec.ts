import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { BASE_UNITS } from '../src/questions/units.ts';
import { FUNCTIONS } from '../src/questions/functions.ts';
import { smallSheet } from './small-sheet.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { keyAnswers } from '../src/questions/key-answers.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { parseQuestion } from '../src/questions/sheet.ts';
import { seedNumber } from './bank-files.ts';

const README = readFileSync(new URL('../bank/README.md', import.meta.url), 'utf8');

/** What stands in the fenced blocks of one language. */
function blocks(language: string): string[] {
  const fence = new RegExp(`\`\`\`${language}\\n(.*?)\`\`\``, 'gs');
  return [...README.matchAll(fence)].map(([, text = '']) => text);
}

describe('how a sheet is written', () => {
  it('shows a whole sheet that can be published and answered', () => {
    const question = parseQuestion(blocks('markdown')[0] ?? '', 'bank/README.md');
    const drawn = drawQuestion(question, seedNumber(1));
    const { marks, outOf } = markQuestion(question, drawn, keyAnswers(question, drawn));
    expect(marks).toBe(outOf);
  });

  it('shows parts of every kind that can be asked as they stand', () => {
    const asked = blocks('yaml').filter((block) => /^[a-h]:/.test(block));
    const { question } = smallSheet(
      `given:
  area: { is: Cable, symbol: A, value: 4 mm² }
  run: { is: Run, symbol: L, value: 5 m }
  rho: { is: Copper, symbol: ρ, value: 0.0175 Ω·mm²/m }
  load: { is: Load, symbol: I, value: 17 A }
  carries: { is: Rating, symbol: I_z, value: 40 A }
  clear: { is: Clear, value: 1 A, shown: false }
steps:
  pair: { symbol: R, unit: mΩ, is: rho * 2 * run / area }
  size: { symbol: I_n, unit: A, is: nextFuse(load) }
  spare: { symbol: s, unit: A, is: carries - load }
ask:
${asked.join('').replace(/^/gm, '  ')}`,
      asked.map((block) => `## ${block[0] ?? ''}\n\nAnswer it.\n`).join('\n'),
    );
    const kinds = ['quantity', 'size', 'choice', 'choices', 'order', 'match'];
    expect(question.parts.map(({ kind }) => kind)).toEqual(kinds);
  });

  it('names every function and every unit', () => {
    expect([...FUNCTIONS.keys()].filter((name) => !README.includes(`\`${name}(`))).toEqual([]);
    const units = BASE_UNITS.map(({ symbol }) => symbol);
    expect(units.filter((symbol) => !README.includes(symbol))).toEqual([]);
  });
});
