import type { Answers, DrawnQuestion } from '@ferrule/assessments';

export type AttemptKind = 'worksheet' | 'practice' | 'sitting';

/** What a marking says of one part, and nothing of how it was explained. */
interface PartMarks {
  readonly id: string;
  readonly verdict: string;
  readonly marks: number;
}

/** What a marking says of one question. */
export interface QuestionMarks {
  readonly marks: number;
  readonly outOf: number;
  readonly parts: readonly PartMarks[];
}

/** One question of an attempt, with all that is needed to mark it again. */
export interface StoredQuestion {
  readonly slug: string;
  readonly subject: string;
  readonly revisionId: string;
  readonly drawn: DrawnQuestion;
  readonly answers: Answers;
  /** How many of the last steps were left to do; null where the question was asked whole. */
  readonly left: number | null;
  /** Null where the marking lacks the question. */
  readonly stored: QuestionMarks | null;
}

/** Figures that were added up when an attempt was marked, by name. */
export type Totals = Readonly<Record<string, number | boolean>>;

/** An attempt as it was marked and stored. */
export interface StoredAttempt {
  readonly kind: AttemptKind;
  readonly id: string;
  readonly questions: readonly StoredQuestion[];
  readonly totals: Totals;
  /** Marks that pass, for a sitting. */
  readonly passMarks: number | null;
}

/** One thing that comes out otherwise than it was stored. */
export interface Difference {
  readonly kind: AttemptKind;
  readonly id: string;
  /** The question, or null for a total of the attempt. */
  readonly question: string | null;
  /** Such as "marks of (b)". */
  readonly what: string;
  readonly stored: string;
  readonly again: string;
}

type Change = Pick<Difference, 'what' | 'stored' | 'again'>;

function change(what: string, stored: unknown, again: unknown): Change[] {
  return stored === again ? [] : [{ what, stored: String(stored), again: String(again) }];
}

/** A question that is refused now has no marks. */
export const REFUSED: QuestionMarks = { marks: 0, outOf: 0, parts: [] };

const inWords = (marked: QuestionMarks | null): string =>
  marked ? `${marked.marks} of ${marked.outOf}` : 'none';

/** What of a question's marking comes out otherwise now; `refusal` says why it has none. */
export function changesIn(
  stored: QuestionMarks | null,
  again: QuestionMarks,
  refusal: string | null,
): Change[] {
  if (refusal !== null) return change('marking', inWords(stored), refusal);
  if (!stored) return change('marking', inWords(null), inWords(again));
  const ids = new Set([...stored.parts, ...again.parts].map(({ id }) => id));
  const parts = [...ids].flatMap((id) => {
    const [was, is] = [stored, again].map(({ parts: all }) => all.find((part) => part.id === id));
    return [
      ...change(`verdict of (${id})`, was?.verdict ?? 'none', is?.verdict ?? 'none'),
      ...change(`marks of (${id})`, was?.marks ?? 'none', is?.marks ?? 'none'),
    ];
  });
  return [
    ...parts,
    ...change('marks', stored.marks, again.marks),
    ...change('marks to be had', stored.outOf, again.outOf),
  ];
}

interface SubjectMarks {
  readonly subject: string;
  readonly marks: number;
  readonly outOf: number;
}

/** The marks of each subject as totals. */
export function subjectTotals(bySubject: readonly SubjectMarks[]): Totals {
  const totals: Record<string, number> = {};
  for (const { subject, marks, outOf } of bySubject) {
    totals[`marks in ${subject}`] = marks;
    totals[`marks to be had in ${subject}`] = outOf;
  }
  return totals;
}

interface Marked {
  readonly subject: string;
  readonly again: QuestionMarks;
}

const sum = (marked: readonly Marked[], of: 'marks' | 'outOf') =>
  marked.reduce((total, { again }) => total + again[of], 0);

/** Adds up again what was added up, under the same names. */
export function totalsOf({ kind, passMarks }: StoredAttempt, marked: readonly Marked[]): Totals {
  if (kind === 'practice') return {};
  const marks = sum(marked, 'marks');
  const totals = { 'total marks': marks, 'total marks to be had': sum(marked, 'outOf') };
  if (passMarks === null) return totals;
  const subjects = [...new Set(marked.map(({ subject }) => subject))];
  const bySubject = subjects.map((subject) => {
    const own = marked.filter((one) => one.subject === subject);
    return { subject, marks: sum(own, 'marks'), outOf: sum(own, 'outOf') };
  });
  return { ...totals, passed: marks >= passMarks, ...subjectTotals(bySubject) };
}

/** What of the totals comes out otherwise now. */
export function changesInTotals(stored: Totals, again: Totals): Change[] {
  const names = new Set([...Object.keys(stored), ...Object.keys(again)]);
  return [...names].flatMap((name) => change(name, stored[name] ?? 'none', again[name] ?? 'none'));
}
