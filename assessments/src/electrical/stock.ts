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

/**
 * Largest size that is not over the value, in the unit of the series.
 *
 * @throws {OutOfRange} when the value is under the smallest size or not a number.
 * @example prevSize(38, FUSE_RATINGS_A) // 35
 */
export function prevSize(value: number, series: readonly number[]): number {
  const size = series.findLast((member) => member <= value * (1 + SLACK));
  if (size !== undefined && Number.isFinite(value)) return size;
  throw new OutOfRange(`No size is as small as ${value}: the series starts at ${series[0]}.`);
}

/**
 * Largest size strictly under the value: the one before, for a value that is itself a size.
 *
 * @throws {OutOfRange} when there is none.
 * @example sizeUnder(10, CABLE_AREAS_MM2) // 6
 */
export function sizeUnder(value: number, series: readonly number[]): number {
  return prevSize(value * (1 - 2 * SLACK), series);
}

/**
 * Size nearest to the value by ratio; of two equally near, the larger.
 *
 * @throws {OutOfRange} when the value is not a positive number.
 * @example nearestSize(5.26, CABLE_AREAS_MM2) // 6
 */
export function nearestSize(value: number, series: readonly number[]): number {
  const [first, ...rest] = series;
  if (first === undefined || !(value > 0 && Number.isFinite(value))) {
    throw new OutOfRange(`No size is near ${value}; give a number above 0.`);
  }
  const distance = (size: number): number => Math.abs(Math.log(size / value));
  return rest.reduce((near, size) => (distance(size) <= distance(near) ? size : near), first);
}
