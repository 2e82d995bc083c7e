import { type Answer } from '../../api/views.ts';

type OpenedItem = Answer<'Worksheets_open'>['items'][number];

export type QuestionView = OpenedItem['question'];
export type PartView = QuestionView['parts'][number];
export type GivenView = QuestionView['given'][number];
export type TableView = QuestionView['tables'][number];
export type DiagramView = NonNullable<QuestionView['diagram']>;
export type CurveView = NonNullable<QuestionView['curve']>;
export type MarkedQuestionView = NonNullable<OpenedItem['marked']>;
export type MarkedPartView = MarkedQuestionView['parts'][number];
export type Answers = OpenedItem['answers'];
export type RawAnswer = Answers[string];

export const blankAnswer: RawAnswer = { text: '', unit: null, option: null, working: '' };

/** Whether all that the part asks for stands in the answer line or among the choices. */
export function isAnswered(part: PartView, answer: RawAnswer | undefined): boolean {
  if (!answer) return false;
  const { options = [] } = answer;
  switch (part.kind) {
    case 'choice':
      return answer.option !== null;
    case 'choices':
      return options.length > 0;
    case 'order':
      return options.length === part.options.length;
    case 'match':
      return options.length > 0 && options.every((option) => option !== '');
    default:
      return answer.text.trim() !== '';
  }
}

/** Whether something has been matched, but not all of it. */
export function isHalfMatched(part: PartView, answer: RawAnswer | undefined): boolean {
  if (part.kind !== 'match' || isAnswered(part, answer)) return false;
  return answer?.options?.some((option) => option !== '') ?? false;
}

export type Standing = 'answered' | 'part' | 'not';

/** How far a question is answered, for terminals and reviews. */
export function standingOf(parts: readonly PartView[], answers: Answers): Standing {
  const done = parts.filter((part) => isAnswered(part, answers[part.id])).length;
  if (done === parts.length) return 'answered';
  const isBegun = done > 0 || parts.some((part) => isHalfMatched(part, answers[part.id]));
  return isBegun ? 'part' : 'not';
}
