import { type Answer } from '../../api/views.ts';

type OpenedItem = Answer<'Worksheets_open'>['items'][number];
type StoredQuestion = OpenedItem['question'];
type StoredMarked = NonNullable<OpenedItem['marked']>;

export type GivenView = StoredQuestion['given'][number];
export type DiagramView = NonNullable<StoredQuestion['diagram']>;
export type CurveView = NonNullable<StoredQuestion['curve']> & {
  batteryVolts?: number[];
  inputVolts?: number[];
  batteryAmps?: number[];
};
export interface TableView {
  caption: string;
  source: string;
  columns: { label: string; unit: string }[];
  rows: string[][];
}
export type PartView = Omit<StoredQuestion['parts'][number], 'kind'> & {
  kind: 'quantity' | 'choice' | 'choices' | 'order' | 'match';
  rows?: { id: string; text: string }[];
};
export type QuestionView = Omit<StoredQuestion, 'parts' | 'curve'> & {
  parts: PartView[];
  tables?: TableView[];
  curve: CurveView | null;
};
export type MarkedPartView = StoredMarked['parts'][number] & {
  wrongStep?: { symbol: string; says: string } | null;
  read?: {
    sheet: string;
    title: string | null;
    heading: string | null;
    paragraph: number | null;
    issued: boolean;
  } | null;
};
export type MarkedQuestionView = Omit<StoredMarked, 'parts'> & { parts: MarkedPartView[] };
export type RawAnswer = OpenedItem['answers'][string] & { options?: string[] };
export type Answers = Record<string, RawAnswer>;

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
