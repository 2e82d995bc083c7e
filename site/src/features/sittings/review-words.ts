import { isAnswered, isHalfMatched, type Standing } from '../../ui/question/views.ts';
import { joinAnd, sayNumber, upperFirst } from '../../ui/words.ts';
import { type DeskState } from './answer-desk.ts';
import { type SittingItem } from './queries.ts';

const are = (count: number) => (count === 1 ? 'is' : 'are');

/** "Ten questions are answered, one is part answered and one is blank." */
export function sayStandings(standings: readonly Standing[]): string {
  const count = (standing: Standing) => standings.filter((one) => one === standing).length;
  const [answered, part, not] = [count('answered'), count('part'), count('not')];
  if (answered === standings.length) return 'Every question is answered.';
  const clauses = [
    `${upperFirst(sayNumber(answered))} ${answered === 1 ? 'question is' : 'questions are'} answered`,
    ...(part > 0 ? [`${sayNumber(part)} ${are(part)} part answered`] : []),
    ...(not > 0 ? [`${sayNumber(not)} ${are(not)} blank`] : []),
  ];
  const last = clauses.pop() ?? '';
  return `${clauses.join(', ')} and ${last}. A blank loses its marks; a wrong answer loses no more than that.`;
}

const sayParts = (parts: readonly { id: string }[]) => joinAnd(parts.map(({ id }) => `(${id})`));

/** "Part answered, (b) is blank" */
export function sayStanding(item: SittingItem, standing: Standing, state: DeskState): string {
  if (standing === 'answered') return 'Answered';
  if (standing === 'not') return 'Not answered';
  const answers = state.answers[item.key] ?? {};
  const missing = item.question.parts.filter((part) => !isAnswered(part, answers[part.id]));
  const half = missing.filter((part) => isHalfMatched(part, answers[part.id]));
  const blank = missing.filter((part) => !half.includes(part));
  const clauses = [
    ...(blank.length > 0 ? [`${sayParts(blank)} ${are(blank.length)} blank`] : []),
    ...(half.length > 0 ? [`${sayParts(half)} ${are(half.length)} not all matched`] : []),
  ];
  return `Part answered, ${clauses.join(', ')}`;
}

/** "Two to come back to: 4 and 7." Empty when there is none. */
export function sayComeBack(items: readonly SittingItem[], pennants: Record<string, boolean>) {
  const marked = items.filter(({ key }) => pennants[key]).map(({ number }) => String(number));
  if (marked.length === 0) return '';
  return `${upperFirst(sayNumber(marked.length))} to come back to: ${joinAnd(marked)}.`;
}
