import type { CompiledCourse } from '../publishing/compiled-course.ts';
import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import type { KeptRecall } from './worksheet-attempt.ts';

/** How many a worksheet asks. */
const ASKED = 3;

type Sheet = Pick<CompiledLesson, 'number' | 'title' | 'revision' | 'recall'>;

/** What a worksheet of the unit may ask back: of the units before it, or of its own when none is issued. */
export function recallPool(
  units: CompiledCourse['units'],
  unit: number,
  lessons: readonly Sheet[],
): KeptRecall[] {
  const at = units.findIndex(({ number }) => number === unit);
  const earlier = recallOf(units.slice(0, at), lessons);
  return earlier.length > 0 ? earlier : recallOf(units.slice(at, at + 1), lessons);
}

function recallOf(units: CompiledCourse['units'], lessons: readonly Sheet[]): KeptRecall[] {
  const numbers = new Set(units.flatMap(({ sheets }) => sheets));
  return lessons
    .filter(({ number }) => numbers.has(number))
    .flatMap(({ number, title, revision, recall }) =>
      recall.map(({ ask, answer }) => ({ sheet: { number, title }, revision, ask, answer })),
    );
}

interface Asking {
  /** What the person was asked before, once for each time. */
  readonly asked: readonly KeptRecall[];
  /** Where chance puts a question; the same for the same attempt. */
  readonly rank: (question: KeptRecall) => string;
}

/** Those asked least often first, then those of sheets not yet among the chosen, then by rank. */
export function chooseRecall(pool: readonly KeptRecall[], { asked, rank }: Asking): KeptRecall[] {
  const timesAsked = countBy(asked, nameOf);
  const ranked = pool
    .map((question) => ({ question, rank: rank(question) }))
    .sort((one, other) => (one.rank < other.rank ? -1 : 1))
    .map(({ question }) => question);
  const chosen: KeptRecall[] = [];
  while (chosen.length < Math.min(ASKED, pool.length)) {
    const ofSheet = countBy(chosen, ({ sheet }) => sheet.number);
    const [next] = ranked
      .filter((question) => !chosen.includes(question))
      .map((question) => ({
        question,
        times: timesAsked.get(nameOf(question)) ?? 0,
        beside: ofSheet.get(question.sheet.number) ?? 0,
      }))
      .sort((one, other) => one.times - other.times || one.beside - other.beside);
    if (next) chosen.push(next.question);
  }
  return chosen;
}

/** A question keeps its name when its lesson is issued anew. */
const nameOf = ({ sheet, ask }: KeptRecall) => `${sheet.number} ${ask}`;

function countBy<T>(items: readonly T[], nameOfItem: (item: T) => string): Map<string, number> {
  const counts = new Map<string, number>();
  for (const item of items) counts.set(nameOfItem(item), (counts.get(nameOfItem(item)) ?? 0) + 1);
  return counts;
}
