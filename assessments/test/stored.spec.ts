import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { openQuestion } from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { keyAnswers } from '../src/questions/key-answers.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { presentQuestion } from '../src/questions/present.ts';
import {
  type Answers,
  type CompiledQuestion,
  type DrawnQuestion,
  type MarkedQuestion,
  type QuestionView,
} from '../src/questions/types.ts';
import { workQuestion } from '../src/questions/work.ts';
import { seedNumber } from './bank-files.ts';

interface Kept {
  question: CompiledQuestion;
  drawn: DrawnQuestion;
  answers: Answers;
  view: QuestionView;
  marked: MarkedQuestion;
}

/** Kept before table extracts, orders, pairs and headings to read were there. */
function keptAs(slug: string): Kept {
  const file = new URL(`./stored/${slug}.json`, import.meta.url);
  return JSON.parse(readFileSync(file, 'utf8')) as Kept;
}

describe.each(['vd-chart-table', 'rd-chain'])('%s, stored in an earlier form', (slug) => {
  const { question, drawn, answers, view, marked } = keptAs(slug);

  it('is presented and marked as it was then', () => {
    expect(presentQuestion(question, drawn)).toMatchObject(view);
    const { markerVersion, ...then } = marked;
    const again = markQuestion(question, drawn, answers);
    expect(again).toMatchObject(then);
    expect(again.markerVersion).toBeGreaterThan(markerVersion);
  });

  it('has nothing of what was added since', () => {
    expect(presentQuestion(question, drawn).tables).toEqual([]);
    expect(workQuestion(question, drawn).tables).toEqual([]);
    for (const part of markQuestion(question, drawn, {}).parts) expect(part.read).toBeNull();
  });

  it('is drawn anew and answered right', () => {
    const again = drawQuestion(question, seedNumber(6));
    const { marks, outOf } = markQuestion(question, again, keyAnswers(question, again));
    expect(marks).toBe(outOf);
  });

  it('is completed once, so that what is worked out for it is kept', () => {
    expect(openQuestion(question)).toBe(openQuestion(question));
  });
});
