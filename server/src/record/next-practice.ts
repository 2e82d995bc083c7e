import { isRight, isShown, type AnsweredQuestion } from './answered-question.ts';

/** Why a question is worth practising next. */
export type PracticeReason =
  'went-wrong' | 'one-day-only' | 'with-help' | 'never-tried' | 'longest-ago';

/** A question of the practice bank. */
export interface BankQuestion {
  readonly slug: string;
  readonly subject: string;
  /** Number of its sheet. */
  readonly lesson: string;
  readonly level: 'recall' | 'apply' | 'reason';
}

export interface PracticeAdvice {
  readonly slug: string;
  readonly reason: PracticeReason;
  /** The day it was answered last; null when never. */
  readonly lastDay: string | null;
}

const MOST_ADVISED = 3;
/** The most useful first. */
const REASONS: readonly PracticeReason[] = [
  ...(['went-wrong', 'one-day-only', 'with-help', 'never-tried', 'longest-ago'] as const),
];
const LEVELS = ['recall', 'apply', 'reason'];

interface Candidate extends PracticeAdvice {
  readonly question: BankQuestion;
}

/** Null when it was shown this very day: it can wait. */
function reasonFor(answers: readonly AnsweredQuestion[], today: string): PracticeReason | null {
  const last = answers.at(-1);
  if (!last) return 'never-tried';
  if (!isRight(last)) return 'went-wrong';
  const days = new Set(answers.filter(isShown).map(({ day }) => day));
  if (days.size === 0) return 'with-help';
  if (days.has(today)) return null;
  return days.size === 1 ? 'one-day-only' : 'longest-ago';
}

const inCourseOrder = (a: BankQuestion, b: BankQuestion) =>
  a.lesson.localeCompare(b.lesson, 'en', { numeric: true }) ||
  LEVELS.indexOf(a.level) - LEVELS.indexOf(b.level) ||
  a.slug.localeCompare(b.slug);

/** What went wrong comes back the latest first, what went well the longest ago first. */
function byUse(a: Candidate, b: Candidate): number {
  const first = REASONS.indexOf(a.reason) - REASONS.indexOf(b.reason);
  if (first !== 0) return first;
  const age = (a.lastDay ?? '').localeCompare(b.lastDay ?? '');
  return (a.reason === 'went-wrong' ? -age : age) || inCourseOrder(a.question, b.question);
}

/** Each pick as far from the others as can be: another reason and subject, then another of either. */
function pick(candidates: readonly Candidate[]): Candidate[] {
  const picked: Candidate[] = [];
  const isNew = (of: (candidate: Candidate) => string, one: Candidate) =>
    picked.every((other) => of(other) !== of(one));
  const isOfNewSubject = (one: Candidate) => isNew(({ question }) => question.subject, one);
  const rounds: ((one: Candidate) => boolean)[] = [
    (one) => isNew(({ reason }) => reason, one) && isOfNewSubject(one),
    isOfNewSubject,
    () => true,
  ];
  for (const mayJoin of rounds) {
    for (const one of candidates) {
      if (picked.length < MOST_ADVISED && !picked.includes(one) && mayJoin(one)) picked.push(one);
    }
  }
  return picked.sort(byUse);
}

/**
 * At most three questions to practise next, the most useful first.
 *
 * @param answers - of one person, by question, each oldest first.
 * @param today - calendar day, YYYY-MM-DD.
 */
export function nextPractice(
  bank: readonly BankQuestion[],
  answers: ReadonlyMap<string, readonly AnsweredQuestion[]>,
  today: string,
): PracticeAdvice[] {
  const candidates = bank.flatMap((question): Candidate[] => {
    const given = answers.get(question.slug) ?? [];
    const reason = reasonFor(given, today);
    const lastDay = given.at(-1)?.day ?? null;
    return reason ? [{ slug: question.slug, reason, lastDay, question }] : [];
  });
  return pick(candidates.sort(byUse)).map(({ slug, reason, lastDay }) => ({
    ...{ slug, reason, lastDay },
  }));
}
