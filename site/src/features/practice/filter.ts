import { type BankQuestion } from './queries.ts';

export interface Filter {
  subject: string | null;
  level: BankQuestion['level'] | null;
  find: string;
}

export interface SubjectCount {
  code: string;
  name: string;
  questions: number;
  shown: number;
}

/** From four fifths of the marks on, done whole and without a hint. */
const shownPercent = 80;

export type State = 'shown' | 'tried' | 'open';

export function stateOf({ best, tries }: BankQuestion): State {
  if (best && best.percent >= shownPercent) return 'shown';
  return tries > 0 ? 'tried' : 'open';
}

export function isLevel(text: string | null): text is BankQuestion['level'] {
  return text === 'recall' || text === 'apply' || text === 'reason';
}

export function readFilter(params: URLSearchParams): Filter {
  const level = params.get('level');
  return {
    subject: params.get('subject'),
    level: isLevel(level) ? level : null,
    find: params.get('find') ?? '',
  };
}

/** Only what is chosen stands in the address. */
export function writeFilter({ subject, level, find }: Filter): URLSearchParams {
  return new URLSearchParams({
    ...(subject && { subject }),
    ...(level && { level }),
    ...(find && { find }),
  });
}

/** The questions asked for, all of them where nothing is. */
export function filterBank(
  questions: readonly BankQuestion[],
  { subject, level, find }: Filter,
): BankQuestion[] {
  const wanted = find.trim().toLowerCase();
  return questions.filter(
    (question) =>
      (subject === null || question.subject.code === subject) &&
      (level === null || question.level === level) &&
      question.title.toLowerCase().includes(wanted),
  );
}

/** Subject by subject, in the order of the list. */
export function bySubject(questions: readonly BankQuestion[]): Map<string, BankQuestion[]> {
  const groups = new Map<string, BankQuestion[]>();
  for (const question of questions) {
    const { code } = question.subject;
    groups.set(code, [...(groups.get(code) ?? []), question]);
  }
  return groups;
}

export function countSubjects(questions: readonly BankQuestion[]): SubjectCount[] {
  return [...bySubject(questions).values()].flatMap((ofSubject) => {
    const [first] = ofSubject;
    if (!first) return [];
    const shown = ofSubject.filter((question) => stateOf(question) === 'shown').length;
    return [{ ...first.subject, questions: ofSubject.length, shown }];
  });
}
