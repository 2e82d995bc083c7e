import { OutOfRange } from './out-of-range.ts';

/** Blade fuse-links, A: ISO 8820-3 (from memory). */
export const BLADE_A: readonly number[] = [1, 2, 3, 4, 5, 7.5, 10, 15, 20, 25, 30, 35, 40];

/** Bolt-down fuse-links, A: ISO 8820-5 (from memory). */
export const BOLT_DOWN_A: readonly number[] = [
  30, 40, 50, 60, 70, 80, 100, 125, 150, 175, 200, 225, 250, 300,
];

/**
 * Standard ampere ratings, A: NEC 240.6(A), 15 to 800 A, as in a university's design appendix;
 * 225 and 400 A, which that copy leaves out, from memory.
 */
export const NEC_240_6_A: readonly number[] = [
  15, 20, 25, 30, 35, 40, 45, 50, 60, 70, 80, 90, 100, 110, 125, 150, 175, 200, 225, 250, 300, 350,
  400, 450, 500, 600, 700, 800,
];

/** One decade of preferred numbers as miniature fuse-links print them: IEC 60127-1 annex A. */
const R20_DECADE: readonly number[] = [
  1, 1.12, 1.25, 1.4, 1.6, 1.8, 2, 2.24, 2.5, 2.8, 3.15, 3.55, 4, 4.5, 5, 5.6, 6.3, 7.1, 8, 9,
];

/**
 * Preferred ratings between two currents, A: 10 or 20 steps a decade.
 *
 * Source: R10 and R20 of IEC 60127-1 annex A (second-hand copy, 315 mA to 10 A).
 *
 * @throws {OutOfRange} when the bounds are not above 0, in order and within 1 mA to 1 kA.
 * @example preferredRatingsA(10, { leastA: 1, mostA: 2 }) // [1, 1.25, 1.6, 2]
 */
export function preferredRatingsA(
  steps: 10 | 20,
  between: { leastA: number; mostA: number },
): number[] {
  const { leastA, mostA } = between;
  if (!(leastA >= 0.001 && mostA <= 1000 && leastA <= mostA)) {
    throw new OutOfRange(
      `Ratings from ${leastA} to ${mostA} A are outside 0.001 to 1000 A; give the smaller bound first.`,
    );
  }
  const decade = R20_DECADE.filter((_, index) => steps === 20 || index % 2 === 0);
  const decades = [-3, -2, -1, 0, 1, 2, 3];
  return decades
    .flatMap((power) => decade.map((step) => Number((step * 10 ** power).toPrecision(4))))
    .filter((rating) => rating >= leastA && rating <= mostA);
}
