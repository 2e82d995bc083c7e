import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Compiled, type Drawn, type DrawnPart, type Part } from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { fadeQuestion, fadingLevels } from '../src/questions/fade.ts';
import { markFaded, markQuestion } from '../src/questions/mark.ts';
import { type Answers, type Line, type RawAnswer } from '../src/questions/types.ts';
import { workQuestion } from '../src/questions/work.ts';
import { answerRight, choose, chooseAll, typeSi } from './answering.ts';
import { openBank, openSheetNamed, seedNumber } from './bank-files.ts';

const read = (lines: Line[] | undefined): string[] =>
  (lines ?? []).map((line) => line.map(({ text }) => text).join(' '));

describe('fading of a chain of four parts', () => {
  const chart = openSheetNamed('vd-chart-table');
  const drawn = drawQuestion(chart, seedNumber(3));
  const worked = workQuestion(chart, drawn);

  it('has a level for every step: the last part has two', () => {
    expect(fadingLevels(chart)).toEqual([0, 1, 2, 3, 4, 5]);
  });

  it('shows the whole worked answer at nought', () => {
    const { shown, asked } = fadeQuestion(chart, drawn, 0);
    expect(shown).toEqual(worked.parts.map(({ id, lines }) => ({ part: id, lines })));
    expect(asked).toEqual([]);
  });

  it('leaves the last step of the last part, with the lines that lead to it', () => {
    const { shown, asked } = fadeQuestion(chart, drawn, 1);
    expect(asked).toEqual(['d']);
    expect(shown.map(({ part }) => part)).toEqual(['a', 'b', 'c', 'd']);
    expect(read(shown[3]?.lines)[0]).toContain('A_min =');
    expect(read(shown[3]?.lines)).toEqual(read(worked.parts[3]?.lines).slice(0, 3));
  });

  it('leaves more at every level, and at last the whole', () => {
    const asked = fadingLevels(chart).map((left) =>
      fadeQuestion(chart, drawn, left).asked.join(''),
    );
    expect(asked).toEqual(['', 'd', 'd', 'cd', 'bcd', 'abcd']);
    expect(fadeQuestion(chart, drawn, 5).shown).toEqual([]);
    expect(fadeQuestion(chart, drawn, 99)).toEqual(fadeQuestion(chart, drawn, 5));
    expect(fadeQuestion(chart, drawn, -1)).toEqual(fadeQuestion(chart, drawn, 0));
  });
});

/** Any answers: right where the noise is 1, or a slip, off by a factor, another choice or order. */
function someAnswers(question: Compiled, drawn: Drawn, noise: readonly number[]): Answers {
  const answers = answerRight(question, drawn);
  question.parts.forEach((part, index) => {
    const factor = noise[index] ?? 1;
    const held = drawn.parts[part.id];
    if (factor !== 1 && held) answers[part.id] = offAnswer(question, { part, held, factor });
  });
  return answers;
}

function offAnswer(
  question: Compiled,
  { part, held, factor }: { part: Part; held: DrawnPart; factor: number },
): RawAnswer {
  if (held.kind === 'quantity') {
    const slip = factor < 1 ? held.slips[0]?.value : undefined;
    return typeSi(question, part, slip ?? held.key * factor);
  }
  const ids = held.options.map(({ id }) => id);
  return held.kind === 'options'
    ? choose(ids[Math.floor(factor * 7) % ids.length] ?? '')
    : chooseAll(ids);
}

const someNoise = fc.array(fc.oneof(fc.constant(1), fc.double({ min: 0.2, max: 3, noNaN: true })), {
  minLength: 8,
  maxLength: 8,
});

describe('every level of every question', () => {
  const bank = openBank();

  it('gives the same answer the same verdict and marks', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...bank),
        fc.nat({ max: 300 }),
        someNoise,
        (question, seed, noise) => {
          const drawn = drawQuestion(question, seedNumber(seed)) as Drawn;
          const given = someAnswers(question, drawn, noise);
          for (const left of fadingLevels(question)) {
            const { asked } = fadeQuestion(question, drawn, left);
            const mine = Object.entries(given).filter(([id]) => asked.includes(id));
            // In the whole question, what is shown at this level counts as answered right.
            const whole = { ...answerRight(question, drawn), ...Object.fromEntries(mine) };
            const parts = markQuestion(question, drawn, whole).parts;
            const faded = markFaded(question, drawn, { left, answers: given }).parts;
            expect(faded.map(({ id, verdict, marks }) => [id, verdict, marks])).toEqual(
              parts
                .filter(({ id }) => asked.includes(id))
                .map(({ id, verdict, marks }) => [id, verdict, marks]),
            );
          }
        },
      ),
      { numRuns: 150 },
    );
  });

  it('asks for no more than the next and shows no more than the worked answer', () => {
    for (const question of bank) {
      const drawn = drawQuestion(question, seedNumber(8));
      const worked = new Set(
        workQuestion(question, drawn).parts.flatMap(({ lines }) => read(lines)),
      );
      const levels = fadingLevels(question).map((left) => fadeQuestion(question, drawn, left));
      expect(levels.at(-1)?.asked).toEqual(question.parts.map(({ id }) => id));
      levels.forEach(({ asked, shown }, left) => {
        expect(asked.length).toBeLessThanOrEqual(left);
        for (const { lines } of shown) {
          for (const line of read(lines)) expect(worked.has(line), line).toBe(true);
        }
      });
    }
  });
});
