import { SUBJECTS } from '@ferrule/assessments';
import type { PracticeQuestion } from '../questions/practice-question.ts';
import { isShown, type AnsweredQuestion } from './answered-question.ts';
import type { PracticeAdvice, PracticeReason } from './next-practice.ts';
import type { SubjectRecords } from './record.schemas.ts';

const WORDS: Readonly<Record<PracticeReason, string>> = {
  'went-wrong': 'It went wrong last time.',
  'one-day-only': 'Shown on one day only. Show it again on another.',
  'with-help': 'Right with help so far. Do it whole, on your own.',
  'never-tried': 'You have never tried it.',
  'longest-ago': 'It is the longest since you showed it.',
};

const subjectOf = (code: string) => ({ code, name: SUBJECTS[code] ?? code });

/** One row for each subject, those with nothing shown as well. */
export function presentSubjects(
  bank: readonly PracticeQuestion[],
  answers: ReadonlyMap<string, readonly AnsweredQuestion[]>,
): SubjectRecords['subjects'] {
  return Object.keys(SUBJECTS).map((code) => {
    const questions = bank.filter(({ subject }) => subject === code);
    const shown = questions
      .map(({ slug }) => (answers.get(slug) ?? []).filter(isShown))
      .filter((answered) => answered.length > 0);
    const days = [...new Set(shown.flat().map(({ day }) => day))].sort();
    return {
      ...subjectOf(code),
      questions: questions.length,
      shown: shown.length,
      days: days.length,
      lastDay: days.at(-1) ?? null,
    };
  });
}

export function presentAdvice(
  advice: readonly PracticeAdvice[],
  bank: readonly PracticeQuestion[],
): SubjectRecords['next'] {
  const questions = new Map(bank.map((question) => [question.slug, question]));
  return advice.flatMap(({ slug, reason, lastDay }) => {
    const question = questions.get(slug);
    if (!question) return [];
    const { title, level, lesson, marks } = question;
    const subject = subjectOf(question.subject);
    return [{ slug, title, subject, level, lesson, marks, reason, says: WORDS[reason], lastDay }];
  });
}
