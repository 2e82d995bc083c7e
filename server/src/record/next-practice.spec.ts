import { describe, expect, it } from '@jest/globals';
import { bySlug, type AnsweredQuestion } from './answered-question.ts';
import { nextPractice, type BankQuestion } from './next-practice.ts';

const TODAY = '2026-12-01';

const question = (slug: string, over: Partial<BankQuestion> = {}): BankQuestion => ({
  ...{ slug, subject: slug.slice(0, 2).toUpperCase(), lesson: '3.4', level: 'apply' },
  ...over,
});
const answered = (
  slug: string,
  day: string,
  over: Partial<AnsweredQuestion> = {},
): AnsweredQuestion => ({
  ...{ slug, day, at: new Date(`${day}T12:00:00Z`), percent: 100, isWhole: true, isHinted: false },
  ...over,
});
const advise = (bank: BankQuestion[], answers: AnsweredQuestion[] = []) =>
  nextPractice(bank, bySlug(answers), TODAY).map(({ slug, reason }) => `${slug} ${reason}`);

describe('what to practise next', () => {
  it('begins a new person at the start of the course, each subject once', () => {
    const bank = [
      question('vd-b', { lesson: '3.10' }),
      question('vd-a', { lesson: '3.4' }),
      question('cl-b', { lesson: '1.1', level: 'reason' }),
      question('cl-a', { lesson: '1.1', level: 'recall' }),
      question('si-a', { lesson: '1.4' }),
    ];
    expect(advise(bank)).toEqual(['cl-a never-tried', 'si-a never-tried', 'vd-a never-tried']);
  });

  it('tells each reason apart', () => {
    const reasonOf = (...answers: AnsweredQuestion[]) =>
      advise([question('vd-a')], answers).map((said) => said.split(' ')[1])[0] ?? null;
    expect(reasonOf()).toBe('never-tried');
    expect(reasonOf(answered('vd-a', '2026-11-01', { percent: 79 }))).toBe('went-wrong');
    expect(reasonOf(answered('vd-a', '2026-11-01', { percent: 80 }))).toBe('one-day-only');
    expect(reasonOf(answered('vd-a', '2026-11-01', { isHinted: true }))).toBe('with-help');
    expect(reasonOf(answered('vd-a', '2026-11-01', { isWhole: false }))).toBe('with-help');
    expect(reasonOf(answered('vd-a', '2026-11-01'), answered('vd-a', '2026-11-02'))).toBe(
      'longest-ago',
    );
    expect(
      reasonOf(answered('vd-a', '2026-11-01'), answered('vd-a', '2026-11-02', { percent: 0 })),
    ).toBe('went-wrong');
    expect(reasonOf(answered('vd-a', TODAY))).toBeNull();
  });

  it('puts what went wrong first, then what was shown on one day only', () => {
    const bank = ['ba-a', 'cl-a', 'so-a', 'vd-a'].map((slug) => question(slug));
    const answers = [
      answered('cl-a', '2026-11-03'),
      answered('vd-a', '2026-11-02', { percent: 20 }),
      answered('so-a', '2026-11-01'),
      answered('so-a', '2026-11-04'),
    ];
    expect(advise(bank, answers)).toEqual([
      'vd-a went-wrong',
      'cl-a one-day-only',
      'ba-a never-tried',
    ]);
  });

  it('takes different reasons before different questions of one reason', () => {
    const bank = ['ba-a', 'cl-a', 'co-a', 'vd-a'].map((slug) => question(slug));
    const wrong = { percent: 0 };
    const answers = [
      answered('ba-a', '2026-11-01', wrong),
      answered('cl-a', '2026-11-02', wrong),
      answered('co-a', '2026-11-03', wrong),
    ];
    expect(advise(bank, answers)).toEqual([
      'co-a went-wrong',
      'cl-a went-wrong',
      'vd-a never-tried',
    ]);
  });

  it('comes back to what was shown longest ago when all is shown', () => {
    const bank = ['ba-a', 'cl-a'].map((slug) => question(slug));
    const answers = ['2026-10-01', '2026-10-20'].flatMap((day) => [
      answered('ba-a', day),
      answered('cl-a', day === '2026-10-20' ? '2026-11-20' : day),
    ]);
    expect(advise(bank, answers)).toEqual(['ba-a longest-ago', 'cl-a longest-ago']);
  });

  it('says nothing of questions no longer in the bank', () => {
    expect(advise([], [answered('vd-a', '2026-11-01')])).toEqual([]);
  });
});
