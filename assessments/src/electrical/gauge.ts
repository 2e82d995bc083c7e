import { OutOfRange } from './out-of-range.ts';

/**
 * Gauge number as the formula counts it: 10 for 10 AWG, 0 for 1/0, −1 for 2/0, −2 for 3/0 and
 * −3 for 4/0. A written 1/0 is not one over nought: see gaugeNumber.
 */
type GaugeNumber = number;

const FINEST = 40;
const COARSEST = -3;

/** Thickest first, 4/0 is 0.46 in; each of the 39 steps down to 36 AWG is the 39th root of 92. */
const THIRTY_SIX_GAUGE_MM = 0.127;
const RATIO = 92;
const STEPS = 39;

const MM_PER_MIL = 0.0254;

/** Gauges kept in stock for fixed wiring, thinnest first; 18 AWG serves only inside a sheath. */
export const STOCK_GAUGES: readonly GaugeNumber[] = [
  16, 14, 12, 10, 8, 6, 4, 3, 2, 1, 0, -1, -2, -3,
];

/**
 * Diameter of the solid wire of a gauge, mm.
 *
 * Source: ASTM B258, 0.005 in × 92^((36−n)/39) (from memory; GNU units has the same).
 *
 * @throws {OutOfRange} when the number is not whole, or outside 40 AWG to 4/0 (−3).
 * @example gaugeDiameterMm(10) // 2.5882
 */
export function gaugeDiameterMm(gauge: GaugeNumber): number {
  if (!Number.isInteger(gauge) || gauge > FINEST || gauge < COARSEST) {
    throw new OutOfRange(
      `Gauge ${gauge} is not a whole number from ${COARSEST} to ${FINEST}; write 1/0 as 0, 2/0 as −1, 3/0 as −2 and 4/0 as −3.`,
    );
  }
  return THIRTY_SIX_GAUGE_MM * RATIO ** ((36 - gauge) / STEPS);
}

/**
 * Copper area of a gauge, mm².
 *
 * @throws {OutOfRange} as gaugeDiameterMm.
 * @example gaugeAreaMm2(10) // 5.2612
 */
export function gaugeAreaMm2(gauge: GaugeNumber): number {
  return (Math.PI / 4) * gaugeDiameterMm(gauge) ** 2;
}

/**
 * Area of a gauge in circular mils: the square of its diameter in thousandths of an inch.
 *
 * @throws {OutOfRange} as gaugeDiameterMm.
 * @example gaugeCircularMils(-3) // 211600
 */
export function gaugeCircularMils(gauge: GaugeNumber): number {
  return (gaugeDiameterMm(gauge) / MM_PER_MIL) ** 2;
}

/** Area of so many circular mils, mm². */
export function circularMilsToMm2(circularMils: number): number {
  return (Math.PI / 4) * MM_PER_MIL ** 2 * circularMils;
}

/** Circular mils of so many mm². */
export function mm2ToCircularMils(areaMm2: number): number {
  return areaMm2 / circularMilsToMm2(1);
}

/**
 * A gauge as it is written: 10, 1/0, 4/0.
 *
 * @throws {OutOfRange} as gaugeDiameterMm.
 */
export function gaugeName(gauge: GaugeNumber): string {
  gaugeDiameterMm(gauge);
  return gauge > 0 ? String(gauge) : `${1 - gauge}/0`;
}

/**
 * Number of a written gauge: "10" is 10, "1/0" is 0, "4/0" is −3.
 *
 * @throws {OutOfRange} when it is no gauge from 40 to 4/0.
 */
export function gaugeNumber(written: string): GaugeNumber {
  const noughts = /^([1-4])\/0$/.exec(written);
  if (noughts) return 1 - Number(noughts[1]);
  if (/^[1-9]\d?$/.test(written) && Number(written) <= FINEST) return Number(written);
  throw new OutOfRange(`"${written}" is no gauge; write 40 to 1, or 1/0, 2/0, 3/0, 4/0.`);
}
