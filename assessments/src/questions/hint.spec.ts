import { describe, expect, it } from 'vitest';
import { openBank, openSheetNamed, seedNumber } from '../../test/bank-files.ts';
import { drawQuestion } from './draw.ts';
import { hintFor } from './hint.ts';
import { type Line } from './types.ts';
import { workQuestion } from './work.ts';

const read = (line: Line | null | undefined): string | undefined =>
  line?.map(({ text }) => text).join(' ');

describe('a hint', () => {
  it('is the formula its part begins with', () => {
    const question = openSheetNamed('vd-chart-table');
    const drawn = drawQuestion(question, seedNumber(3));
    expect(['a', 'b', 'c', 'd'].map((part) => read(hintFor(question, drawn, part)))).toEqual([
      'R = ρ × 2 L ÷ A',
      'U_d = I × R',
      's = U_d ÷ U',
      'A_min = ρ × 2 L × I ÷ ( p × U )',
    ]);
    expect(hintFor(question, drawn, 'z')).toBeNull();
  });

  it('is the same whatever was drawn, and stands in the worked answer of its part', () => {
    for (const question of openBank()) {
      const [drawn, other] = [1, 2].map((number) => drawQuestion(question, seedNumber(number)));
      if (!drawn || !other) throw new Error('nothing drawn');
      for (const part of workQuestion(question, drawn).parts) {
        const hint = hintFor(question, drawn, part.id);
        expect(hintFor(question, other, part.id)).toEqual(hint);
        if (hint) expect(part.lines.map(read)).toContain(read(hint));
      }
    }
  });

  it('is there for every quantity that is worked out, and for no reading or plain choice', () => {
    for (const question of openBank()) {
      const drawn = drawQuestion(question, seedNumber(5));
      const hints = question.parts.map(({ id }) => hintFor(question, drawn, id));
      const sums = question.steps.filter(({ how }) => how.kind === 'sum');
      expect(hints.some(Boolean)).toBe(sums.length > 0);
    }
    const reading = openSheetNamed('cc-read-flooded');
    const drawn = drawQuestion(reading, seedNumber(5));
    const choice = reading.parts.find(({ kind }) => kind === 'choice');
    expect(choice).toBeDefined();
    expect(hintFor(reading, drawn, choice?.id ?? '')).toBeNull();
  });
});
