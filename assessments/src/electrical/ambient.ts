import { OutOfRange, within } from './out-of-range.ts';
import { type PracticeProfile } from './practice-profile.ts';
import { TABLE_AIR_C } from './rating-table.ts';

/** Jackets the printed bins have, °C, in the order of their columns. */
const BIN_JACKETS_C: readonly number[] = [60, 75, 90];

type Bin = readonly [upperC: number, ...factors: number[]];

/**
 * Upper edge of each bin, °C, and its factors: NEC table 310.15(B)(1), base 30 °C, as adopted in
 * a residential code, E3705.2 (second-hand copy).
 */
const BINS: readonly Bin[] = [
  [10, 1.29, 1.2, 1.15],
  [15, 1.22, 1.15, 1.12],
  [20, 1.15, 1.11, 1.08],
  [25, 1.08, 1.05, 1.04],
  [30, 1, 1, 1],
  [35, 0.91, 0.94, 0.96],
  [40, 0.82, 0.88, 0.91],
  [45, 0.71, 0.82, 0.87],
  [50, 0.58, 0.75, 0.82],
  [55, 0.41, 0.67, 0.76],
  [60, NaN, 0.58, 0.71],
  [65, NaN, 0.47, 0.65],
  [70, NaN, 0.33, 0.58],
  [75, NaN, NaN, 0.5],
  [80, NaN, NaN, 0.41],
  [85, NaN, NaN, 0.29],
];

/**
 * Ambient factor: the root of the heat room left over the heat room at the table's 30 °C.
 *
 * Source: formula of NEC 310.15(B) and IEC 60364-5-52 (from memory).
 *
 * @throws {OutOfRange} when the air is below 0 °C or not cooler than the jacket.
 * @example ambientFactor(90, 50) // 0.8165
 */
export function ambientFactor(jacketC: number, ambientC: number): number {
  within(jacketC, {
    what: 'Jacket temperature',
    unit: '°C',
    least: 60,
    most: 200,
    remedy: 'read it off the cable',
  });
  within(ambientC, {
    what: 'Air temperature',
    unit: '°C',
    least: 0,
    most: jacketC - 1,
    remedy: 'a cable in air as hot as its jacket carries nothing: choose another route or jacket',
  });
  return Math.sqrt((jacketC - ambientC) / (jacketC - TABLE_AIR_C));
}

/**
 * Ambient factor as printed, in bins of 5 K up to each upper edge; between two whole degrees the
 * hotter bin counts. Inside a bin the formula allows a little more.
 *
 * Source: NEC table 310.15(B)(1) (second-hand copy).
 *
 * @throws {OutOfRange} when the table has no column for the jacket, or no factor for the air.
 * @example ambientBin(75, 43) // 0.82
 */
export function ambientBin(jacketC: number, ambientC: number): number {
  const column = binColumn(jacketC);
  if (column === undefined) {
    throw new OutOfRange(
      `No bins for a ${jacketC} °C jacket; the table has ${BIN_JACKETS_C.join(', ')} °C: use the formula.`,
    );
  }
  within(ambientC, {
    what: 'Air temperature',
    unit: '°C',
    least: -40,
    most: 85,
    remedy: 'the table ends there: choose another route',
  });
  const factor = BINS.find(([upperC]) => ambientC <= upperC + 1e-9)?.[column + 1];
  if (factor !== undefined && Number.isFinite(factor)) return factor;
  throw new OutOfRange(
    `The table has no factor for a ${jacketC} °C jacket in ${ambientC} °C air; choose another route or a hotter jacket.`,
  );
}

/**
 * Ambient factor as a practice finds it: by the formula, or by the bins where the table has the
 * jacket and by the formula where it has not.
 *
 * @throws {OutOfRange} as the method used.
 * @example ambientFactorIn(PROFILES.awg, { jacketC: 75, ambientC: 43 }) // 0.82
 */
export function ambientFactorIn(
  profile: Pick<PracticeProfile, 'correction'>,
  at: { jacketC: number; ambientC: number },
): number {
  const byBins = profile.correction === 'bins' && binColumn(at.jacketC) !== undefined;
  return (byBins ? ambientBin : ambientFactor)(at.jacketC, at.ambientC);
}

function binColumn(jacketC: number): number | undefined {
  const column = BIN_JACKETS_C.findIndex((jacket) => Math.abs(jacket - jacketC) < 1e-6);
  return column < 0 ? undefined : column;
}
