import { within } from './out-of-range.ts';

/** Batteries alike, so many in series, so many such strings in parallel. */
export interface BatteryBank {
  blockV: number;
  blockAh: number;
  inSeries: number;
  inParallel: number;
}

/**
 * Volts, ampere-hours and watt-hours of a bank: series adds volts, parallel adds ampere-hours
 * (definition).
 *
 * @param bank - volts 1 to 60, ampere-hours 1 to 2000 at the 20-hour rate, whole numbers up to 16.
 * @throws {OutOfRange} when a figure lies outside.
 */
export function bankOf({ blockV, blockAh, inSeries, inParallel }: BatteryBank): {
  volts: number;
  capacityAh: number;
  wattHours: number;
} {
  requireFigure(blockV, { what: 'Battery voltage', unit: 'V', least: 1, most: 60 });
  requireFigure(blockAh, { what: 'Battery capacity', unit: 'Ah', least: 1, most: 2000 });
  requireCount(inSeries, 'Batteries in series');
  requireCount(inParallel, 'Strings in parallel');
  const volts = blockV * inSeries;
  const capacityAh = blockAh * inParallel;
  return { volts, capacityAh, wattHours: volts * capacityAh };
}

/**
 * Ampere-hours that may be used of a bank, Ah; the depth allowed is the battery maker's (common
 * practice, no source).
 *
 * @param depth - share that may be taken out, 0 to 1.
 * @throws {OutOfRange} when a figure lies outside.
 */
export function usableAh(capacityAh: number, depth: number): number {
  requireFigure(capacityAh, { what: 'Battery capacity', unit: 'Ah', least: 1, most: 10_000 });
  return capacityAh * requireShare(depth, 'Depth allowed');
}

/**
 * Capacity that gives a daily use for so many days without a charge, Ah: use times days over the
 * depth allowed (common practice, no source).
 *
 * @throws {OutOfRange} when a figure lies outside.
 */
export function capacityForUse(use: { dailyAh: number; days: number; depth: number }): number {
  requireFigure(use.dailyAh, { what: 'Daily use', unit: 'Ah', least: 0, most: 10_000 });
  requireFigure(use.days, { what: 'Days between charges', unit: 'd', least: 0.1, most: 60 });
  const depth = requireShare(use.depth, 'Depth allowed');
  return (use.dailyAh * use.days) / depth;
}

/**
 * How two batteries alike share a current when both cables sit on the near one: the far one works
 * through two links more (current divider, definition).
 *
 * @param pair - resistance of each battery and of one link, Ω, above 0 to 1; amps drawn.
 * @throws {OutOfRange} when a figure lies outside.
 */
export function shareInParallel(pair: { batteryOhms: number; linkOhms: number; amps: number }): {
  nearA: number;
  farA: number;
} {
  requireFigure(pair.batteryOhms, { what: 'Battery resistance', unit: 'Ω', least: 1e-5, most: 1 });
  requireFigure(pair.linkOhms, { what: 'Link resistance', unit: 'Ω', least: 0, most: 1 });
  requireFigure(pair.amps, { what: 'Current', unit: 'A', least: 0, most: 2000 });
  const farOhms = pair.batteryOhms + 2 * pair.linkOhms;
  const nearA = (pair.amps * farOhms) / (pair.batteryOhms + farOhms);
  return { nearA, farA: pair.amps - nearA };
}

function requireFigure(
  value: number,
  bounds: { what: string; unit: string; least: number; most: number },
): number {
  return within(value, { ...bounds, remedy: 'check the figure and its unit' });
}

function requireShare(share: number, what: string): number {
  const remedy = 'give it as a share, 0.5 for half';
  return within(share, { what, unit: 'of the capacity', least: 0.05, most: 1, remedy });
}

function requireCount(count: number, what: string): void {
  const isWhole = Number.isInteger(count);
  const remedy = 'give a whole number';
  within(isWhole ? count : NaN, { what, unit: '', least: 1, most: 16, remedy });
}
