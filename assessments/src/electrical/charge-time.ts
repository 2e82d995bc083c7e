import { OutOfRange, within } from './out-of-range.ts';

/** A night's use to be put back in bulk, with loads running. */
export interface BulkCharge {
  /** Taken out, Ah. */
  usedAh: number;
  /** Share of the ampere-hours put in that stays; lead-acid about 0.85, lithium about 0.99. */
  efficiency: number;
  chargerA: number;
  loadA: number;
}

/**
 * Ampere-hours to put in for so many taken out, Ah (coulombic efficiency: university text on
 * photovoltaics, second-hand copy; lithium from memory).
 *
 * @param usedAh - 0 to 5000.
 * @param efficiency - 0.5 to 1.
 * @throws {OutOfRange} when a figure lies outside.
 */
export function ahToReturn(usedAh: number, efficiency: number): number {
  within(usedAh, {
    what: 'Use',
    unit: 'Ah',
    least: 0,
    most: 5000,
    remedy: 'give what was taken out of the battery',
  });
  within(efficiency, {
    what: 'Charge efficiency',
    unit: 'of what is put in',
    least: 0.5,
    most: 1,
    remedy: 'give it as a share, 0.85 for 85 %',
  });
  return usedAh / efficiency;
}

/**
 * Hours of bulk to put a use back, the loads taking their share first; absorption comes on top
 * (identity).
 *
 * @throws {OutOfRange} when a figure lies outside or the loads take all the charger gives.
 */
export function bulkHours({ usedAh, efficiency, chargerA, loadA }: BulkCharge): number {
  const batteryA = chargerA - loadA;
  if (!(batteryA > 0)) {
    throw new OutOfRange(
      `A ${chargerA} A charger cannot charge behind a ${loadA} A load; lower the load.`,
    );
  }
  return ahToReturn(usedAh, efficiency) / batteryA;
}

/**
 * The same with quiet running, half output, until its time-out (common practice, no source).
 *
 * @param quietH - 0 to 24.
 * @throws {OutOfRange} when a figure lies outside or the loads take all of half output.
 */
export function quietHours(charge: BulkCharge, quietH: number): number {
  within(quietH, {
    what: 'Quiet running',
    unit: 'h',
    least: 0,
    most: 24,
    remedy: 'give its time-out',
  });
  const half = { ...charge, chargerA: charge.chargerA / 2 };
  const wholeH = bulkHours(half);
  if (wholeH <= quietH) return wholeH;
  const gotAh = (half.chargerA - half.loadA) * quietH;
  const leftAh = ahToReturn(charge.usedAh, charge.efficiency) - gotAh;
  return quietH + leftAh / (charge.chargerA - charge.loadA);
}

/**
 * Mean current of a charger that stops for so long in every turn, A: the off-load look (common
 * practice, no source).
 *
 * @throws {OutOfRange} when the stop is as long as the turn.
 */
export function meanWithLooks(chargerA: number, look: { everyS: number; forS: number }): number {
  within(look.forS, {
    what: 'Off-load look',
    unit: 's',
    least: 0,
    most: look.everyS * 0.999,
    remedy: 'it lasts some seconds in some minutes',
  });
  return (chargerA * (look.everyS - look.forS)) / look.everyS;
}

/** Looks in an hour. */
export function looksPerHour(everyS: number): number {
  return 3600 / everyS;
}
