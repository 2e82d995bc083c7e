import { describe, expect, it } from 'vitest';
import { openBank, seedNumber } from '../../test/bank-files.ts';
import { type Compiled, type Drawn } from './compiled.ts';
import { drawQuestion } from './draw.ts';
import { judgeQuestion } from './judge-question.ts';
import { keyAnswers } from './key-answers.ts';
import { markQuestion } from './mark.ts';
import { type Answers, type RawAnswer } from './types.ts';

const ODD = ['', '0', '-5', '1e6', '1,234', 'about 5', '3 parsecs', '12 V'];

/** Right, slipped at each part, and something odd in every part. */
function waysToAnswer(question: Compiled, drawn: Drawn): Answers[] {
  const right = keyAnswers(question, drawn);
  const slipped = question.parts.map(({ id }) => keyAnswers(question, drawn, [id]));
  const odd = ODD.map((text) =>
    Object.fromEntries(
      Object.entries(right).map(([id, answer]): [string, RawAnswer] => [id, { ...answer, text }]),
    ),
  );
  return [right, ...slipped, ...odd, {}];
}

describe('judging without explaining', () => {
  it('comes to the marks, verdicts and rules of marking, over the whole bank', () => {
    for (const question of openBank()) {
      const drawn = drawQuestion(question, seedNumber(7)) as Drawn;
      for (const answers of waysToAnswer(question, drawn)) {
        const judged = judgeQuestion(question, drawn, answers);
        const marked = markQuestion(question, drawn, answers);
        const { slug } = question.meta;
        expect([judged.marks, judged.outOf, judged.markerVersion], slug).toEqual([
          ...[marked.marks, marked.outOf, marked.markerVersion],
        ]);
        expect(judged.parts, slug).toEqual(
          marked.parts.map(({ id, verdict, marks, outOf }) => ({
            ...{ id, verdict, marks, outOf },
            rule: marked.trace.findLast(({ part }) => part === id)?.rule,
          })),
        );
      }
    }
  });
});
