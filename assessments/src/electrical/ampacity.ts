import { OutOfRange, within } from './out-of-range.ts';
import { CABLE_AREAS_MM2 } from './stock.ts';

/** Jackets of the house rating table, °C, in the order of its columns. */
const JACKETS_C: readonly number[] = [60, 75, 90, 105];

/**
 * House rating table: A in 30 °C air, one cable, under 50 V. Each metric size takes the row of
 * the largest gauge that is not larger: 33 CFR 183.425 table 5 (second-hand copy), read down.
 */
const HOUSE_RATINGS_A: Readonly<Record<number, readonly number[]>> = {
  1.5: [15, 15, 25, 25],
  2.5: [20, 20, 30, 35],
  4: [25, 25, 40, 45],
  6: [40, 40, 55, 60],
  10: [55, 65, 70, 80],
  16: [80, 95, 100, 120],
  25: [105, 125, 135, 160],
  35: [140, 170, 180, 210],
  50: [165, 195, 210, 245],
  70: [225, 265, 285, 330],
  95: [260, 310, 330, 385],
  120: [300, 360, 385, 445],
};

/** Circuits bunched in one enclosure: BS 7671 table 4C1, first arrangement (second-hand copy). */
const BUNCHED: Readonly<Record<number, number>> = {
  1: 1,
  2: 0.8,
  3: 0.7,
  4: 0.65,
  5: 0.6,
  6: 0.57,
  7: 0.54,
  8: 0.52,
  9: 0.5,
  12: 0.45,
  16: 0.41,
  20: 0.38,
};

/** Engine spaces at 50 °C: 33 CFR 183.425 note 1 (from memory). */
const ENGINE_SPACE: Readonly<Record<number, number>> = { 60: 0.58, 75: 0.75, 90: 0.82, 105: 0.85 };

/** Air temperature the house table is printed for, °C. */
const TABLE_AIR_C = 30;

/**
 * Rating of a single cable by the house table, A.
 *
 * @throws {OutOfRange} when size or jacket is not in the table.
 * @example ratingAmps(10, 105) // 80
 */
export function ratingAmps(areaMm2: number, jacketC: number): number {
  const column = JACKETS_C.findIndex((jacket) => Math.abs(jacket - jacketC) < 1e-6);
  const size = CABLE_AREAS_MM2.find((area) => Math.abs(area - areaMm2) < 1e-6);
  const rating = size === undefined ? undefined : HOUSE_RATINGS_A[size]?.[column];
  if (rating !== undefined) return rating;
  throw new OutOfRange(
    `No rating for ${areaMm2} mm² with a ${jacketC} °C jacket; the table has ${CABLE_AREAS_MM2.join(', ')} mm² and ${JACKETS_C.join(', ')} °C.`,
  );
}

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
 * Factor for loaded circuits bunched in one enclosure.
 *
 * Source: BS 7671 table 4C1 (second-hand copy).
 *
 * @throws {OutOfRange} when the table has no row for the number.
 * @example groupingFactor(4) // 0.65
 */
export function groupingFactor(circuits: number): number {
  const factor = BUNCHED[circuits];
  if (factor !== undefined) return factor;
  throw new OutOfRange(
    `Table 4C1 has no row for ${circuits} circuits; use one of ${Object.keys(BUNCHED).join(', ')}.`,
  );
}

/**
 * Factor for cable through an engine space at 50 °C.
 *
 * Source: 33 CFR 183.425 note 1 (from memory).
 *
 * @throws {OutOfRange} when the jacket is not in the note.
 * @example engineSpaceFactor(105) // 0.85
 */
export function engineSpaceFactor(jacketC: number): number {
  const factor = ENGINE_SPACE[Math.round(jacketC * 1e6) / 1e6];
  if (factor !== undefined) return factor;
  throw new OutOfRange(
    `No engine-space factor for a ${jacketC} °C jacket; use one of ${Object.keys(ENGINE_SPACE).join(', ')} °C.`,
  );
}

/**
 * Smallest stock cable whose derated rating is not under the current, mm².
 *
 * @throws {OutOfRange} when none is large enough or the factor is not above 0 and at most 1.3.
 * @example sizeForCurrent({ amps: 42, jacketC: 105, factor: 0.6 }) // 10
 */
export function sizeForCurrent(job: { amps: number; jacketC: number; factor: number }): number {
  within(job.factor, {
    what: 'Rating factor',
    unit: '',
    least: 0.01,
    most: 1.3,
    remedy: 'multiply the ambient and grouping factors',
  });
  const size = CABLE_AREAS_MM2.find(
    (areaMm2) => ratingAmps(areaMm2, job.jacketC) * job.factor >= job.amps * (1 - 1e-9),
  );
  if (size !== undefined) return size;
  throw new OutOfRange(
    `No stock cable carries ${job.amps} A at factor ${job.factor}; split the load or change the route.`,
  );
}
