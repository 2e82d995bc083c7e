/**
 * Marks as a whole per cent, rounded down: 79.9 % must never read as the 80 that would pass.
 * The one computation that views, lamps and lists all use.
 */
export const percentOf = (marks: number, outOf: number): number =>
  outOf === 0 ? 0 : Math.floor((marks * 100) / outOf);

interface Handed {
  readonly marks: number | null;
  readonly outOf: number;
  readonly handedInAt: Date | null;
}

/** A handed-in attempt with its score. */
export interface Score {
  readonly marks: number;
  readonly outOf: number;
  readonly percent: number;
  readonly on: Date;
}

/** The best of the attempts handed in, the earliest of equals; every one had fresh figures. */
export function bestOf(attempts: readonly Handed[]): Score | null {
  const scores = attempts.flatMap(({ marks, outOf, handedInAt }) =>
    marks === null || handedInAt === null
      ? []
      : [{ marks, outOf, percent: percentOf(marks, outOf), on: handedInAt }],
  );
  scores.sort((a, b) => b.percent - a.percent || a.on.getTime() - b.on.getTime());
  return scores[0] ?? null;
}

/** Whether the lamp of a unit is lit by this score. */
export const isLit = (best: { percent: number } | null, passPercent: number): boolean =>
  best !== null && best.percent >= passPercent;
