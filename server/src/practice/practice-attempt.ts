import type { DrawnQuestion } from '@ferrule/assessments';
import type { QuestionView } from '../questions/question-view.ts';

/** What was drawn and what was shown of it. */
export interface KeptDraw {
  readonly slug: string;
  readonly drawn: DrawnQuestion;
  readonly view: QuestionView;
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
