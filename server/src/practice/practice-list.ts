import { SUBJECTS } from '@ferrule/assessments';
import type { PracticeQuestion } from '../questions/practice-question.ts';
import { bestOf, type AnsweredQuestion } from '../record/answered-question.ts';
import type { PracticeProfile } from '../school/practice-profile.ts';
import type { FindPractice, PracticeList } from './practice.schemas.ts';

type Listed = PracticeList['questions'][number];

const SUBJECT_CODES = Object.keys(SUBJECTS);
const LEVELS = ['recall', 'apply', 'reason'];

/** Questions of the school's practice first, then through the subjects in the order of the course. */
const inListOrder = (profile: PracticeProfile) => (a: PracticeQuestion, b: PracticeQuestion) =>
  Number(b.profile === profile) - Number(a.profile === profile) ||
  SUBJECT_CODES.indexOf(a.subject) - SUBJECT_CODES.indexOf(b.subject) ||
  a.lesson.localeCompare(b.lesson, 'en', { numeric: true }) ||
  LEVELS.indexOf(a.level) - LEVELS.indexOf(b.level) ||
  a.slug.localeCompare(b.slug);

const isWanted =
  ({ subject, level, lesson }: FindPractice) =>
  (question: PracticeQuestion) =>
    (subject === undefined || question.subject === subject) &&
    (level === undefined || question.level === level) &&
    (lesson === undefined || question.lesson === lesson);

function listed(question: PracticeQuestion, answers: readonly AnsweredQuestion[]): Listed {
  const { slug, title, level, lesson, marks, kinds, readsCurve, profile } = question;
  const best = bestOf(answers);
  return {
    ...{ slug, title, level, lesson, marks, kinds, readsCurve, profile },
    subject: { code: question.subject, name: SUBJECTS[question.subject] ?? question.subject },
    tries: answers.length,
    best: best && { percent: best.percent, on: best.day },
  };
}

/** The practice bank as one person finds it. */
export function listPractice(
  bank: readonly PracticeQuestion[],
  { wanted, profile }: { wanted: FindPractice; profile: PracticeProfile },
  answers: ReadonlyMap<string, readonly AnsweredQuestion[]>,
): PracticeList {
  const questions = bank
    .filter(isWanted(wanted))
    .sort(inListOrder(profile))
    .map((question) => listed(question, answers.get(question.slug) ?? []));
  return { profile, questions };
}
