import { OutOfRange } from './out-of-range.ts';

/** Flexible cable kept in stock for fixed wiring, mm² (IEC 60228 sizes, from memory). */
export const CABLE_AREAS_MM2: readonly number[] = [1.5, 2.5, 4, 6, 10, 16, 25, 35, 50, 70, 95, 120];

/** Blade and bolt-down fuse-links in one row, A (ISO 8820, from memory). */
export const FUSE_RATINGS_A: readonly number[] = [
  1, 2, 3, 4, 5, 7.5, 10, 15, 20, 25, 30, 35, 40, 50, 60, 70, 80, 100, 125, 150, 175, 200, 225, 250,
  300,
];

/** Sums that land on a stock size must not be pushed to the next one by the last binary digit. */
const SLACK = 1e-9;

/**
 * Smallest stock size that is not under the value, in the unit of the series.
 *
 * @throws {OutOfRange} when the value is above the largest size or not a positive number.
 * @example nextSize(7.02, CABLE_AREAS_MM2) // 10
 */
export function nextSize(value: number, series: readonly number[]): number {
  const size = value > 0 ? series.find((member) => member >= value * (1 - SLACK)) : undefined;
  if (size !== undefined) return size;
  const largest = series.at(-1);
  throw new OutOfRange(
    `No stock size fits ${value}: the series ends at ${largest}; shorten the run, share the load or use cables in parallel.`,
  );
}
