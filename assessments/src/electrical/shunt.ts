import { within } from './out-of-range.ts';

/** A shunt by its label, such as 500 A / 50 mV, class 0.5. */
export interface Shunt {
  ratedA: number;
  ratedMv: number;
}

/**
 * Resistance of a shunt, Ω.
 *
 * @throws {OutOfRange} when the label is none of a shunt.
 * @example shuntOhms({ ratedA: 100, ratedMv: 50 }) // 0.0005
 */
export function shuntOhms(shunt: Shunt): number {
  requireShunt(shunt);
  return shunt.ratedMv / 1000 / shunt.ratedA;
}

/**
 * What stands across a shunt at a current, mV; its sign is the current's.
 *
 * @throws {OutOfRange} when the current is over the shunt's rating.
 * @example shuntMillivolts({ ratedA: 500, ratedMv: 50 }, 40) // 4
 */
export function shuntMillivolts(shunt: Shunt, amps: number): number {
  requireShunt(shunt);
  within(amps, {
    what: 'Current through the shunt',
    unit: 'A',
    least: -shunt.ratedA,
    most: shunt.ratedA,
    remedy: 'fit a shunt rated for the current',
  });
  return (amps * shunt.ratedMv) / shunt.ratedA;
}

/**
 * Most a shunt may be out by, A: its class is a share of the rated current, whatever flows.
 *
 * Source: IEC 60051 (from memory).
 *
 * @throws {OutOfRange} when the class is not between 0.05 and 5.
 * @example shuntErrorA({ ratedA: 500, ratedMv: 50 }, 0.5) // 2.5
 */
export function shuntErrorA(shunt: Shunt, classPercent: number): number {
  requireShunt(shunt);
  within(classPercent, {
    what: 'Class',
    unit: '%',
    least: 0.05,
    most: 5,
    remedy: 'read it off the shunt; 0.5 is usual',
  });
  return (classPercent / 100) * shunt.ratedA;
}

function requireShunt({ ratedA, ratedMv }: Shunt): void {
  within(ratedA, {
    what: 'Shunt’s rated current',
    unit: 'A',
    least: 1,
    most: 10_000,
    remedy: 'read it off the shunt',
  });
  within(ratedMv, {
    what: 'Shunt’s rated voltage',
    unit: 'mV',
    least: 10,
    most: 300,
    remedy: 'read it off the shunt; 50 and 75 mV are usual',
  });
}
