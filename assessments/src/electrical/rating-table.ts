import { gaugeAreaMm2, gaugeName } from './gauge.ts';
import { OutOfRange } from './out-of-range.ts';
import { type PracticeProfile } from './practice-profile.ts';
import { CABLE_AREAS_MM2 } from './stock.ts';

/** Jackets of the small craft table, °C, in the order of its columns. */
const JACKETS_C: readonly number[] = [60, 75, 80, 90, 105, 125, 200];

/** Jackets the house table keeps of them. */
const HOUSE_JACKETS_C: readonly number[] = [60, 75, 90, 105];

interface Row {
  gauge: number;
  areaMm2: number;
  amps: readonly number[];
}

/**
 * Allowable amperage of one cable under 50 V in 30 °C air, thinnest gauge first:
 * 33 CFR 183.425 table 5 (public domain; second-hand copy).
 */
const TABLE_FIVE: readonly Row[] = (
  [
    [18, 10, 10, 15, 20, 20, 25, 25],
    [16, 15, 15, 20, 25, 25, 30, 35],
    [14, 20, 20, 25, 30, 35, 40, 45],
    [12, 25, 25, 35, 40, 45, 50, 55],
    [10, 40, 40, 50, 55, 60, 70, 70],
    [8, 55, 65, 70, 70, 80, 90, 100],
    [6, 80, 95, 100, 100, 120, 125, 135],
    [4, 105, 125, 130, 135, 160, 170, 180],
    [3, 120, 145, 150, 155, 180, 195, 210],
    [2, 140, 170, 175, 180, 210, 225, 240],
    [1, 165, 195, 210, 210, 245, 265, 280],
    [0, 195, 230, 245, 245, 285, 305, 325],
    [-1, 225, 265, 285, 285, 330, 355, 370],
    [-2, 260, 310, 330, 330, 385, 410, 430],
    [-3, 300, 360, 385, 385, 445, 475, 510],
  ] as const
).map(([gauge, ...amps]) => ({ gauge, areaMm2: gaugeAreaMm2(gauge), amps }));

/** Temperature of the air the tables are printed for, °C. */
export const TABLE_AIR_C = 30;

/** A gauge's area and a size of the same copper differ in their last digits only. */
const SAME_COPPER = 1e-4;

/** Jackets a practice's table has, °C, coolest first. */
export function jacketsC(profile: Pick<PracticeProfile, 'ratingTable'>): readonly number[] {
  return profile.ratingTable === 'house' ? HOUSE_JACKETS_C : JACKETS_C;
}

/**
 * Allowable amperage of a gauge by the small craft table, A: under 50 V, one cable, 30 °C air.
 *
 * Source: 33 CFR 183.425 table 5 (second-hand copy).
 *
 * @param gauge - its number: 10, 0 for 1/0, −3 for 4/0.
 * @throws {OutOfRange} when gauge or jacket is not in the table.
 * @example gaugeRatingAmps(10, 105) // 60
 */
export function gaugeRatingAmps(gauge: number, jacketC: number): number {
  const row = TABLE_FIVE.find((one) => one.gauge === gauge);
  if (row) return columnOf(row, jacketC);
  throw new OutOfRange(
    `No rating for gauge ${gauge}; the table has ${TABLE_FIVE.map((one) => gaugeName(one.gauge)).join(', ')}.`,
  );
}

/**
 * Rating of a single cable by the house table, A: each metric size takes the row of the largest
 * gauge that is not larger, read down.
 *
 * Source: 33 CFR 183.425 table 5 (second-hand copy).
 *
 * @throws {OutOfRange} when size or jacket is not in the table.
 * @example ratingAmps(10, 105) // 80
 */
export function ratingAmps(areaMm2: number, jacketC: number): number {
  const size = CABLE_AREAS_MM2.find((area) => Math.abs(area - areaMm2) < 1e-6);
  const hasJacket = HOUSE_JACKETS_C.some((jacket) => Math.abs(jacket - jacketC) < 1e-6);
  if (size !== undefined && hasJacket) return readDown(size, jacketC);
  throw new OutOfRange(
    `No rating for ${areaMm2} mm² with a ${jacketC} °C jacket; the table has ${CABLE_AREAS_MM2.join(', ')} mm² and ${HOUSE_JACKETS_C.join(', ')} °C.`,
  );
}

/**
 * Rating of a single cable as a practice reads it, A, by its copper area: the house table's own
 * sizes, or the small craft table's gauge of that copper or the next thinner.
 *
 * @throws {OutOfRange} when size or jacket is not in the practice's table.
 * @example ratingIn(PROFILES.awg, { areaMm2: gaugeAreaMm2(10), jacketC: 105 }) // 60
 */
export function ratingIn(
  profile: Pick<PracticeProfile, 'ratingTable'>,
  cable: { areaMm2: number; jacketC: number },
): number {
  const { areaMm2, jacketC } = cable;
  return profile.ratingTable === 'house'
    ? ratingAmps(areaMm2, jacketC)
    : readDown(areaMm2, jacketC);
}

/**
 * The jacket one column to the left, °C: what is read by mistake beside the right column.
 *
 * @throws {OutOfRange} when the jacket is not in the practice's table or is its first.
 * @example jacketBefore(PROFILES.metric, 105) // 90
 */
export function jacketBefore(
  profile: Pick<PracticeProfile, 'ratingTable'>,
  jacketC: number,
): number {
  const jackets = jacketsC(profile);
  const before = jackets[jackets.findIndex((jacket) => Math.abs(jacket - jacketC) < 1e-6) - 1];
  if (before !== undefined) return before;
  throw new OutOfRange(
    `No column stands before ${jacketC} °C; the table has ${jackets.join(', ')} °C.`,
  );
}

function readDown(areaMm2: number, jacketC: number): number {
  const row = TABLE_FIVE.findLast((one) => one.areaMm2 <= areaMm2 * (1 + SAME_COPPER));
  // One more gauge step would begin at 135 mm²: the table says nothing of such cable.
  if (row && areaMm2 < 135) return columnOf(row, jacketC);
  throw new OutOfRange(
    `No rating for ${areaMm2} mm²; the table runs from 18 AWG (0.823 mm²) to 4/0 (107 mm²).`,
  );
}

function columnOf({ amps }: Row, jacketC: number): number {
  const rating = amps[JACKETS_C.findIndex((jacket) => Math.abs(jacket - jacketC) < 1e-6)];
  if (rating !== undefined) return rating;
  throw new OutOfRange(
    `No rating for a ${jacketC} °C jacket; the table has ${JACKETS_C.join(', ')} °C.`,
  );
}
