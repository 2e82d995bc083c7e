import type { DrawnQuestion, MarkedQuestion } from '@ferrule/assessments';
import { createHash } from 'node:crypto';
import type { Answers, QuestionView } from '../questions/question-view.ts';

/** One question of an attempt: all that was drawn and shown, so that it opens again as it was. */
export interface KeptItem {
  readonly key: string;
  readonly slug: string;
  readonly revisionId: string;
  readonly author: string;
  /** The sheet to read again, if the question has one in this course. */
  readonly sheet: { readonly number: string; readonly title: string } | null;
  readonly drawn: DrawnQuestion;
  readonly view: QuestionView;
}

/** A recall question of a lesson as it stood when the attempt was started. */
export interface KeptRecall {
  readonly sheet: { readonly number: string; readonly title: string };
  /** The lesson's. */
  readonly revision: string;
  readonly ask: string;
  readonly answer: string;
}

export type AnswersByItem = Record<string, Answers>;
export type MarkedByItem = Record<string, MarkedQuestion>;

/** What lists and course maps need of an attempt. */
export interface AttemptSummary {
  readonly id: string;
  readonly accountId: string;
  readonly worksheet: string;
  readonly attempt: number;
  readonly startedAt: Date;
  readonly handedInAt: Date | null;
  readonly marks: number | null;
  readonly outOf: number;
}

export interface WorksheetAttempt extends AttemptSummary {
  readonly courseRevisionId: string;
  readonly variant: string;
  readonly items: readonly KeptItem[];
  /** Said to oneself, never marked; empty in attempts started before there were any. */
  readonly recall: readonly KeptRecall[];
  readonly answers: AnswersByItem;
  readonly savedAt: Date | null;
  readonly marked: MarkedByItem | null;
}

/** An attempt about to be kept; its number is given by the database. */
export type NewAttempt = Pick<
  WorksheetAttempt,
  | 'id'
  | 'accountId'
  | 'worksheet'
  | 'courseRevisionId'
  | 'variant'
  | 'items'
  | 'recall'
  | 'outOf'
  | 'startedAt'
>;

const LETTERS = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/** A short code to tell attempts apart on paper, such as K7-218. */
export function variantOf(attemptId: string): string {
  const [letter = 0, digit = 0, high = 0, low = 0] = createHash('sha256')
    .update(attemptId)
    .digest();
  const number = ((high << 8) | low) % 1_000;
  return `${LETTERS[letter % LETTERS.length] ?? 'A'}${digit % 10}-${String(number).padStart(3, '0')}`;
}

type Figures = Pick<QuestionView, 'given' | 'curve'>;

/** What a trainee would recognise: the same figures drawn again are the same. */
export const figuresOf = (slug: string, { given, curve }: Figures): string =>
  JSON.stringify([slug, given.map(({ label, value, unit }) => [label, value, unit]), curve]);

/** A question of words alone has none: drawing it anew changes only the order of its choices. */
export const hasFigures = ({ given, curve }: Figures): boolean =>
  given.length > 0 || curve !== null;

export const marksOf = (marked: MarkedByItem): number =>
  Object.values(marked).reduce((sum, { marks }) => sum + marks, 0);
