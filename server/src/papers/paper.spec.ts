import type { Blueprint } from '@ferrule/assessments';
import { describe, expect, it } from '@jest/globals';
import { marksOf, questionCount } from './paper.ts';

const blueprint = {
  questions: [
    { subject: 'VD', count: 2 },
    { subject: 'RD', count: 1 },
  ],
} as Blueprint;

describe('a paper', () => {
  it('has as many questions as its subjects ask for', () => {
    expect(questionCount(blueprint)).toBe(3);
  });

  it('tells its marks when they are the same whatever is drawn', () => {
    const even = [
      { subject: 'VD', marks: 4 },
      { subject: 'VD', marks: 4 },
      { subject: 'RD', marks: 5 },
      { subject: 'CC', marks: 9 },
    ];
    expect(marksOf(blueprint, even)).toBe(13);
  });

  it('keeps them open when questions of a subject differ, or there are none', () => {
    const uneven = [
      { subject: 'VD', marks: 4 },
      { subject: 'VD', marks: 3 },
      { subject: 'RD', marks: 5 },
    ];
    expect(marksOf(blueprint, uneven)).toBeNull();
    expect(marksOf(blueprint, uneven.slice(0, 1))).toBeNull();
  });
});
