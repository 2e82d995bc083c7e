import { within } from './out-of-range.ts';

/** A capacity and the time it was measured over: 100 Ah at the 20-hour rate. */
export interface RatedCapacity {
  capacityAh: number;
  ratedHours: number;
  /** Peukert's exponent, 1 (none) to 1.6. */
  exponent: number;
}

/**
 * Hours at a current by the rated form of Peukert's law, t = H (C / (I H))^k. At the rated current
 * it gives the rated time. The law describes lead-acid batteries (identity of the law; exponents
 * from memory).
 *
 * @param amps - above 0 to 1000.
 * @throws {OutOfRange} when a figure lies outside.
 */
export function hoursAtRate(rated: RatedCapacity, amps: number): number {
  requireRated(rated);
  requireAmps(amps);
  const { capacityAh, ratedHours, exponent } = rated;
  return ratedHours * (capacityAh / (amps * ratedHours)) ** exponent;
}

/** Ampere-hours had at a current by the rated form, Ah. */
export function ahAtRate(rated: RatedCapacity, amps: number): number {
  return amps * hoursAtRate(rated, amps);
}

/**
 * Hours at a current by the short form, t = C / I^k. Its C is the capacity at 1 A: with the
 * capacity of a plate, which is at 20 hours, it comes out far too short (form as printed in an
 * engineering text; both forms recomputed).
 *
 * @param capacityAtOneAmpAh - 1 to 10 000.
 * @throws {OutOfRange} when a figure lies outside.
 */
export function hoursByShortForm(
  capacityAtOneAmpAh: number,
  exponent: number,
  amps: number,
): number {
  requireRated({ capacityAh: capacityAtOneAmpAh, ratedHours: 20, exponent });
  requireAmps(amps);
  return capacityAtOneAmpAh / amps ** exponent;
}

/** The capacity at 1 A that makes both forms agree, Ah. */
export function capacityAtOneAmp(rated: RatedCapacity): number {
  return hoursAtRate(rated, 1);
}

function requireRated({ capacityAh, ratedHours, exponent }: RatedCapacity): void {
  within(capacityAh, {
    what: 'Battery capacity',
    unit: 'Ah',
    least: 1,
    most: 10_000,
    remedy: 'give the capacity of the battery’s plate',
  });
  within(ratedHours, {
    what: 'Rated time',
    unit: 'h',
    least: 1,
    most: 100,
    remedy: 'it is 20 h on most plates',
  });
  within(exponent, {
    what: 'Peukert’s exponent',
    unit: '',
    least: 1,
    most: 1.6,
    remedy: 'it is 1 for no loss and about 1.2 for lead-acid',
  });
}

function requireAmps(amps: number): void {
  within(amps, {
    what: 'Current',
    unit: 'A',
    least: 0.01,
    most: 1000,
    remedy: 'give the steady discharge current',
  });
}
