import { lowerFirst, sayNumber } from '../../ui/words.ts';
import { type ResultView } from './queries.ts';

/** "22 of 40, three marks short" */
export function sayMarks({ marks, outOf, passMarks, passed }: ResultView): string {
  const got = `${marks} of ${outOf}`;
  if (passed) return got;
  const short = passMarks - marks;
  return `${got}, ${sayNumber(short)} ${short === 1 ? 'mark' : 'marks'} short`;
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
