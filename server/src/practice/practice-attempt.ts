import type { DrawnQuestion, FadedQuestion } from '@ferrule/assessments';
import type { QuestionView } from '../questions/question-view.ts';

/** What was drawn and what was shown of it. */
export interface KeptDraw {
  readonly slug: string;
  readonly drawn: DrawnQuestion;
  readonly view: QuestionView;
  /** What was worked beforehand; missing where the question was asked whole. */
  readonly faded?: FadedQuestion;
}

export interface PracticeAttempt {
  readonly id: string;
  readonly accountId: string;
  readonly questionRevisionId: string;
  readonly kept: KeptDraw;
  /** Parts a hint was given for, in the order they were asked. */
  readonly hints: readonly string[];
  readonly handedInAt: Date | null;
}

/** The question as far as it was asked. */
export const askedOf = ({ view, faded }: KeptDraw): QuestionView =>
  faded ? { ...view, parts: view.parts.filter(({ id }) => faded.asked.includes(id)) } : view;
