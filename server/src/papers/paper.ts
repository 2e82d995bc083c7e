import type { Blueprint } from '@ferrule/assessments';

/** A paper as it stands now: its blueprint and the scheme a pass leads to. */
export interface Paper {
  readonly revisionId: string;
  readonly schemeId: string;
  readonly blueprint: Blueprint;
  /** SHA-256 of the agreement's bytes, in hexadecimal: what a candidate agrees to. */
  readonly agreementHash: string;
}

/** Where someone may practise a subject. */
export interface Practice {
  readonly sheet: string;
  readonly title: string;
  /** Number of the unit's worksheet. */
  readonly worksheet: string | null;
}

/** How many questions a paper has. */
export function questionCount(blueprint: Blueprint): number {
  return blueprint.questions.reduce((sum, { count }) => sum + count, 0);
}

/**
 * The marks of a paper, known beforehand only when within each subject every question of the
 * pool is worth the same.
 */
export function marksOf(
  blueprint: Blueprint,
  pool: readonly { subject: string; marks: number }[],
): number | null {
  let sum = 0;
  for (const { subject, count } of blueprint.questions) {
    const worth = new Set(pool.filter((q) => q.subject === subject).map(({ marks }) => marks));
    const [marks] = worth;
    if (worth.size !== 1 || marks === undefined) return null;
    sum += marks * count;
  }
  return sum;
}
