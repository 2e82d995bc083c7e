import { OutOfRange, within } from './out-of-range.ts';
import { type PracticeProfile, PROFILES } from './practice-profile.ts';
import { ratingIn } from './rating-table.ts';
import { stockAreasMm2 } from './size-systems.ts';

/**
 * Factor for cable through an engine space at 50 °C.
 *
 * Source: 33 CFR 183.425 note 1 (from memory).
 *
 * @throws {OutOfRange} when the practice has no factor for the jacket.
 * @example engineSpaceFactor(105) // 0.85
 */
export function engineSpaceFactor(
  jacketC: number,
  profile: Pick<PracticeProfile, 'engineFactors'> = PROFILES.metric,
): number {
  const factor = profile.engineFactors[Math.round(jacketC * 1e6) / 1e6];
  if (factor !== undefined) return factor;
  throw new OutOfRange(
    `No engine-space factor for a ${jacketC} °C jacket; use one of ${Object.keys(profile.engineFactors).join(', ')} °C.`,
  );
}

/** A condition of the route and what it leaves of the rating. */
export interface Condition {
  /** As printed: "50 °C air". */
  is: string;
  factor: number;
}

/** One step of a chain of conditions. */
export interface Derating extends Condition {
  /** What is left after it, A. */
  amps: number;
}

/**
 * What a chain of conditions leaves of a cable's rating, one step a condition, in their order.
 * They multiply: the order changes the steps, not the end.
 *
 * Source: products of factors as in FAA AC 43.13-1B example 2 (second-hand copy).
 *
 * @throws {OutOfRange} when a factor is not above 0 and at most 1.3.
 * @example derate(47, [{ is: '20 000 ft', factor: 0.91 }, { is: '8 wires', factor: 0.6 }])
 */
export function derate(tableAmps: number, conditions: readonly Condition[]): Derating[] {
  let amps = tableAmps;
  return conditions.map((condition) => {
    amps *= checkedFactor(condition.factor);
    return { ...condition, amps };
  });
}

/**
 * Smallest stock cable whose derated rating is not under the current, by its copper, mm².
 *
 * @throws {OutOfRange} when none is large enough or the factor is not above 0 and at most 1.3.
 * @example sizeForCurrent({ amps: 42, jacketC: 105, factor: 0.6 }) // 10
 */
export function sizeForCurrent(
  job: { amps: number; jacketC: number; factor: number },
  profile: PracticeProfile = PROFILES.metric,
): number {
  checkedFactor(job.factor);
  const size = stockAreasMm2(profile).find(
    (areaMm2) =>
      ratingIn(profile, { areaMm2, jacketC: job.jacketC }) * job.factor >= job.amps * (1 - 1e-9),
  );
  if (size !== undefined) return size;
  throw new OutOfRange(
    `No stock cable carries ${job.amps} A at factor ${job.factor}; split the load or change the route.`,
  );
}

function checkedFactor(factor: number): number {
  return within(factor, {
    what: 'Rating factor',
    unit: '',
    least: 0.01,
    most: 1.3,
    remedy: 'multiply the ambient and grouping factors',
  });
}
