import { type ResultView } from './queries.ts';

const words = 'no one two three four five six seven eight nine ten eleven twelve'.split(' ');

const sayCount = (count: number): string => words[count] ?? String(count);

/** "22 of 40, three marks short" */
export function sayMarks({ marks, outOf, passMarks, passed }: ResultView): string {
  const got = `${marks} of ${outOf}`;
  if (passed) return got;
  const short = passMarks - marks;
  return `${got}, ${sayCount(short)} ${short === 1 ? 'mark' : 'marks'} short`;
}

/** "13 of the 18 marks lost are on voltage drop and cable sizing." Null when nothing stands out. */
export function sayWhereLost({ bySubject }: ResultView): string | null {
  const losses = bySubject
    .map(({ name, marks, outOf }) => ({ name, lost: outOf - marks }))
    .filter(({ lost }) => lost > 0)
    .sort((one, other) => other.lost - one.lost);
  const all = losses.reduce((sum, { lost }) => sum + lost, 0);
  const [first] = losses;
  if (!first || losses.length < 2 || first.lost * 2 <= all) return null;
  return `${first.lost} of the ${all} marks lost are on ${lowerFirst(first.name)}.`;
}

const lowerFirst = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);
