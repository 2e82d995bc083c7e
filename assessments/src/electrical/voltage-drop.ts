import { classFiveOhmsPerKm } from './conductors.ts';
import { gaugeOhmsPerKm } from './gauge-resistance.ts';
import { OutOfRange, within } from './out-of-range.ts';
import { type PracticeProfile, PROFILES } from './practice-profile.ts';
import { gaugeOfArea, stockAreasMm2 } from './size-systems.ts';

const RUN = {
  what: 'One-way length',
  unit: 'm',
  least: 0,
  most: 1000,
  remedy: 'give the run in metres, one way',
};
const LOAD = {
  what: 'Current',
  unit: 'A',
  least: 0,
  most: 2000,
  remedy: 'give the load in amperes',
};

const CHASSIS = {
  what: 'Chassis resistance',
  unit: 'Ω',
  least: 0,
  most: 100,
  remedy: 'measure it from bond to bond, in ohms; a sound one is milliohms',
};

/**
 * Voltage lost along a two-core run, there and back, V.
 *
 * @param run - length in metres one way; the return is counted here.
 * @throws {OutOfRange} when length or current is negative or beyond the trade.
 * @example dropAlong({ lengthM: 5, ohmsPerKm: 1.91, amps: 20 }) // 0.382
 */
export function dropAlong(run: { lengthM: number; ohmsPerKm: number; amps: number }): number {
  within(run.lengthM, RUN);
  within(run.amps, LOAD);
  return (2 * run.lengthM * run.ohmsPerKm * run.amps) / 1000;
}

/**
 * Voltage lost with the chassis as the way back, V: one conductor out, and the chassis with its
 * bonds as one resistance.
 *
 * @param run - `chassisOhms` from the load's bond to the battery's, bonds included.
 * @throws {OutOfRange} when length, current or resistance is out of range.
 * @example chassisReturnDrop({ lengthM: 5, ohmsPerKm: 3.3, amps: 10, chassisOhms: 0.004 }) // 0.205
 */
export function chassisReturnDrop(run: {
  lengthM: number;
  ohmsPerKm: number;
  amps: number;
  chassisOhms: number;
}): number {
  within(run.chassisOhms, CHASSIS);
  return dropAlong(run) / 2 + run.amps * run.chassisOhms;
}

/**
 * Copper area that keeps a two-core run within its limit, by resistivity alone, mm².
 * Real cable resists more than its area says: check the stock size in the table afterwards.
 *
 * @throws {OutOfRange} when the limit is not positive, or length or current out of range.
 * @example areaForDrop({ lengthM: 5, amps: 20, limitV: 0.36, ohmMm2PerM: 1 / 58 }) // 9.5785
 */
export function areaForDrop(run: {
  lengthM: number;
  amps: number;
  limitV: number;
  ohmMm2PerM: number;
}): number {
  within(run.lengthM, RUN);
  within(run.amps, LOAD);
  requireLimit(run.limitV);
  return (2 * run.lengthM * run.amps * run.ohmMm2PerM) / run.limitV;
}

/**
 * Resistance of one conductor of a practice's stock cable by its table, Ω/km: class 5 at 20 °C
 * for metric sizes, the gauge table's stranded copper at 75 °C for gauges.
 *
 * @throws {OutOfRange} when the area is no stock cable of the practice.
 */
export function stockOhmsPerKm(areaMm2: number, profile: Pick<PracticeProfile, 'sizes'>): number {
  return profile.sizes === 'metric'
    ? classFiveOhmsPerKm(areaMm2)
    : gaugeOhmsPerKm(gaugeOfArea(areaMm2));
}

/**
 * Smallest stock cable whose table resistance keeps the drop within the limit, by its copper, mm².
 *
 * @throws {OutOfRange} when no stock size does.
 * @example sizeForDrop({ lengthM: 5, amps: 20, limitV: 0.36 }) // 16
 */
export function sizeForDrop(
  run: { lengthM: number; amps: number; limitV: number },
  profile: Pick<PracticeProfile, 'sizes'> = PROFILES.metric,
): number {
  requireLimit(run.limitV);
  const size = stockAreasMm2(profile).find((areaMm2) => {
    const ohmsPerKm = stockOhmsPerKm(areaMm2, profile);
    return dropAlong({ lengthM: run.lengthM, ohmsPerKm, amps: run.amps }) <= run.limitV + 1e-12;
  });
  if (size !== undefined) return size;
  throw new OutOfRange(
    `No stock cable carries ${run.amps} A over ${run.lengthM} m within ${run.limitV} V; shorten the run or raise the system voltage.`,
  );
}

function requireLimit(limitV: number): void {
  if (limitV > 0) return;
  throw new OutOfRange(`Voltage-drop limit ${limitV} V is not above 0 V; give the drop allowed.`);
}
