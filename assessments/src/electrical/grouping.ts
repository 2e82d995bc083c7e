import { OutOfRange } from './out-of-range.ts';

/** How grouped circuits lie. */
export type Arrangement = 'bunched' | 'layer on wall' | 'layer on tray' | 'layer on ladder';

type Row = readonly [circuits: number, ...factors: number[]];

const ARRANGEMENTS: readonly Arrangement[] = [
  'bunched',
  'layer on wall',
  'layer on tray',
  'layer on ladder',
];

/** Loaded circuits to factor: BS 7671:2008 table 4C1 (second-hand copy). */
const TABLE_4C1: readonly Row[] = [
  [1, 1, 1, 1, 1],
  [2, 0.8, 0.85, 0.88, 0.87],
  [3, 0.7, 0.79, 0.82, 0.82],
  [4, 0.65, 0.75, 0.77, 0.8],
  [5, 0.6, 0.73, 0.75, 0.8],
  [6, 0.57, 0.72, 0.73, 0.79],
  [7, 0.54, 0.72, 0.73, 0.79],
  [8, 0.52, 0.71, 0.72, 0.78],
  [9, 0.5, 0.7, 0.72, 0.78],
  [12, 0.45, 0.7, 0.72, 0.78],
  [16, 0.41, 0.7, 0.72, 0.78],
  [20, 0.38, 0.7, 0.72, 0.78],
];

type Steps = readonly (readonly [least: number, factor: number])[];

/** Least number of loaded conductors to factor: NEC table 310.15(B)(3)(a) (second-hand copy). */
const MORE_THAN_THREE: Steps = [
  [1, 1],
  [4, 0.8],
  [7, 0.7],
  [10, 0.5],
  [21, 0.45],
  [31, 0.4],
  [41, 0.35],
];

/** The same of circuits of 50 V and more on small craft: 33 CFR 183.425 note 2 (from memory). */
const NOTE_TWO: Steps = [
  [1, 1],
  [3, 0.7],
  [4, 0.6],
  [7, 0.5],
  [25, 0.4],
];

/** Voltage from which note 2 of the small craft table applies, V (second-hand copy). */
const NOTE_TWO_FROM_V = 50;

/**
 * Factor for loaded circuits run together.
 *
 * Source: BS 7671 table 4C1 (second-hand copy).
 *
 * @throws {OutOfRange} when the table has no row for the number.
 * @example groupingFactor(4) // 0.65
 */
export function groupingFactor(circuits: number, lie: Arrangement = 'bunched'): number {
  const factor = TABLE_4C1.find(([row]) => row === circuits)?.[ARRANGEMENTS.indexOf(lie) + 1];
  if (factor !== undefined) return factor;
  throw new OutOfRange(
    `Table 4C1 has no row for ${circuits} circuits; use one of ${TABLE_4C1.map(([row]) => row).join(', ')}.`,
  );
}

/**
 * Factor for more than three loaded conductors in one raceway or cable.
 *
 * Source: NEC table 310.15(B)(3)(a) (second-hand copy).
 *
 * @throws {OutOfRange} when the number is not a whole one of at least 1.
 * @example conductorsFactor(8) // 0.7
 */
export function conductorsFactor(conductors: number): number {
  return factorFrom(MORE_THAN_THREE, conductors);
}

/**
 * Factor for loaded conductors of one bundle on small craft. Under 50 V the rule sets none: a
 * careful fitter takes one from another table and says which.
 *
 * Source: 33 CFR 183.425 note 2 (from memory); that it binds at 50 V and above (second-hand copy).
 *
 * @throws {OutOfRange} when the number is not a whole one of at least 1.
 * @example smallCraftBundleFactor(6, 12) // 1
 */
export function smallCraftBundleFactor(conductors: number, volts: number): number {
  const factor = factorFrom(NOTE_TWO, conductors);
  return volts >= NOTE_TWO_FROM_V ? factor : 1;
}

function factorFrom(steps: Steps, conductors: number): number {
  const step = steps.findLast(([least]) => conductors >= least);
  if (step && Number.isInteger(conductors)) return step[1];
  throw new OutOfRange(
    `${conductors} is no number of conductors; count those that carry the load, both ways.`,
  );
}
