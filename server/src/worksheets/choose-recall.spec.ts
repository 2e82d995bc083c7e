import { describe, expect, it } from '@jest/globals';
import { chooseRecall, recallPool } from './choose-recall.ts';

const lessons = ['1.1', '1.2', '2.1', '2.2', '3.1'].map((number) => ({
  ...{ number, title: `Sheet ${number}`, revision: 'A' },
  recall: ['One?', 'Two?', 'Three?'].map((ask) => ({ ask, answer: `${ask} of ${number}` })),
}));
const unit = (number: number, sheets: string[]) => ({
  ...{ number, title: `Unit ${number}`, sheets, worksheet: null },
});
const units = [unit(1, ['1.1', '1.2']), unit(2, ['2.1', '2.2']), unit(3, ['3.1'])];

const sheetsOf = (pool: { sheet: { number: string } }[]) => [
  ...new Set(pool.map(({ sheet }) => sheet.number)),
];
const byAnswer = ({ answer }: { answer: string }) => answer;

describe('recall questions of a worksheet', () => {
  it('come from the units before its own, and in the first unit from there', () => {
    expect(sheetsOf(recallPool(units, 3, lessons))).toEqual(['1.1', '1.2', '2.1', '2.2']);
    expect(sheetsOf(recallPool(units, 2, lessons))).toEqual(['1.1', '1.2']);
    expect(sheetsOf(recallPool(units, 1, lessons))).toEqual(['1.1', '1.2']);
  });

  it('come from its own unit while no sheet before it is issued', () => {
    const some = lessons.filter(({ number }) => number.startsWith('2'));
    expect(sheetsOf(recallPool(units, 2, some))).toEqual(['2.1', '2.2']);
  });

  it('are three, spread over sheets', () => {
    const chosen = chooseRecall(recallPool(units, 3, lessons), { asked: [], rank: byAnswer });
    expect([chosen.length, sheetsOf(chosen).length]).toEqual([3, 3]);
  });

  it('do not repeat before all were asked', () => {
    const pool = recallPool(units, 3, lessons);
    const asked: typeof pool = [];
    for (let attempt = 1; attempt <= 4; attempt += 1) {
      asked.push(...chooseRecall(pool, { asked, rank: byAnswer }));
    }
    expect(new Set(asked.map(byAnswer)).size).toBe(pool.length);
    expect(chooseRecall(pool, { asked, rank: byAnswer })).toHaveLength(3);
  });

  it('are as many as there are', () => {
    const pool = recallPool(units, 1, lessons).slice(0, 2);
    expect(chooseRecall(pool, { asked: [], rank: byAnswer })).toHaveLength(2);
    expect(chooseRecall([], { asked: [], rank: byAnswer })).toEqual([]);
  });
});
