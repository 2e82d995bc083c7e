import { within } from './out-of-range.ts';

type Point = readonly [multiple: number, leastS: number, mostS: number | null];

/**
 * Multiple of rating to opening time of blade fuse-links, s: ISO 8820-3 (from memory, times of
 * low confidence). Figures to learn the shape by; a maker's curve decides.
 */
const POINTS: readonly Point[] = [
  [1.1, 360_000, null],
  [1.35, 0.75, 600],
  [1.6, 0.25, 50],
  [2, 0.15, 5],
  [3.5, 0.04, 0.5],
];

/** When a fuse-link opens: not before, and not after, s; null where the band names no end. */
export interface OpeningBand {
  leastS: number;
  mostS: number | null;
  /** How far to trust it. */
  by: 'from memory';
}

/**
 * Band in which a blade fuse-link opens at a multiple of its rating. Between two points of the
 * band it opens no sooner than at the higher and no later than at the lower.
 *
 * Source: ISO 8820-3 (from memory, low confidence).
 *
 * @throws {OutOfRange} when the multiple is not 0 to 1000.
 * @example bladeOpening(2) // { leastS: 0.15, mostS: 5, by: 'from memory' }
 */
export function bladeOpening(multiple: number): OpeningBand {
  within(multiple, {
    what: 'Multiple of rating',
    unit: '',
    least: 0,
    most: 1000,
    remedy: 'divide the current by the rating',
  });
  const above = POINTS.find(([point]) => point >= multiple - 1e-9);
  const below = POINTS.findLast(([point]) => point <= multiple + 1e-9);
  return { leastS: above?.[1] ?? 0, mostS: below?.[2] ?? null, by: 'from memory' };
}
