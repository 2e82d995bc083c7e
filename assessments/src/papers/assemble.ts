import { drawsFrom } from '../questions/random.ts';
import { PoolTooSmall } from './pool-too-small.ts';
import { type Blueprint } from './types.ts';

/**
 * Picks the questions of one paper: so many of each subject, in the blueprint's order of subjects.
 * The same seed and pool give the same paper, in whatever order the pool came.
 *
 * @throws {PoolTooSmall} naming every subject that is short.
 */
export function assemblePaper(
  blueprint: Blueprint,
  pool: { slug: string; subject: string }[],
  seed: string,
): string[] {
  const bySubject = (subject: string): string[] =>
    [...new Set(pool.filter((one) => one.subject === subject).map((one) => one.slug))].sort();
  const shortages = blueprint.questions.flatMap(({ subject, count }) => {
    const available = bySubject(subject).length;
    return available < count ? [{ subject, wanted: count, available }] : [];
  });
  if (shortages.length > 0) throw new PoolTooSmall(shortages);
  const draws = drawsFrom(seed);
  return blueprint.questions.flatMap(({ subject, count }) =>
    draws.shuffled(bySubject(subject)).slice(0, count),
  );
}
