import { type Answer } from '../../api/views.ts';

type OpenedItem = Answer<'Worksheets_open'>['items'][number];

export type QuestionView = OpenedItem['question'];
export type PartView = QuestionView['parts'][number];
export type GivenView = QuestionView['given'][number];
export type DiagramView = NonNullable<QuestionView['diagram']>;
export type CurveView = NonNullable<QuestionView['curve']>;
export type MarkedQuestionView = NonNullable<OpenedItem['marked']>;
export type MarkedPartView = MarkedQuestionView['parts'][number];
export type Answers = OpenedItem['answers'];
export type RawAnswer = Answers[string];

export const blankAnswer: RawAnswer = { text: '', unit: null, option: null, working: '' };

/** Whether anything stands in the answer line or among the choices. */
export function isAnswered(part: PartView, answer: RawAnswer | undefined): boolean {
  if (!answer) return false;
  return part.kind === 'choice' ? answer.option !== null : answer.text.trim() !== '';
}

export type Standing = 'answered' | 'part' | 'not';

/** How far a question is answered, for terminals and reviews. */
export function standingOf(parts: readonly PartView[], answers: Answers): Standing {
  const done = parts.filter((part) => isAnswered(part, answers[part.id])).length;
  if (done === parts.length) return 'answered';
  return done === 0 ? 'not' : 'part';
}
