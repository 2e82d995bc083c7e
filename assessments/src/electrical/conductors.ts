import { OutOfRange, within } from './out-of-range.ts';

/** Annealed copper at 20 °C, Ω·mm²/m: the 1/58 of IEC 60028 (from memory). */
export const COPPER_OHM_MM2_PER_M = 1 / 58;

/** Temperature coefficient of copper's resistance at 20 °C, 1/K (IEC 60028, from memory). */
const COPPER_ALPHA_PER_K = 0.00393;

/** Greatest resistance of plain flexible copper at 20 °C, mm² to Ω/km (IEC 60228 class 5, from memory). */
const CLASS_FIVE_OHMS_PER_KM: readonly (readonly [areaMm2: number, ohmsPerKm: number])[] = [
  [0.5, 39],
  [0.75, 26],
  [1, 19.5],
  [1.5, 13.3],
  [2.5, 7.98],
  [4, 4.95],
  [6, 3.3],
  [10, 1.91],
  [16, 1.21],
  [25, 0.78],
  [35, 0.554],
  [50, 0.386],
  [70, 0.272],
  [95, 0.206],
  [120, 0.161],
];

/**
 * Resistance of one flexible copper conductor by its table, at 20 °C, Ω/km.
 *
 * Source: IEC 60228 class 5, plain copper (from memory).
 *
 * @throws {OutOfRange} when the area is no size of the table.
 * @example classFiveOhmsPerKm(6) // 3.3
 */
export function classFiveOhmsPerKm(areaMm2: number): number {
  const row = CLASS_FIVE_OHMS_PER_KM.find(([size]) => Math.abs(size - areaMm2) < 1e-6);
  if (row) return row[1];
  const sizes = CLASS_FIVE_OHMS_PER_KM.map(([size]) => size).join(', ');
  throw new OutOfRange(`Cable area ${areaMm2} mm² is not a stock size; use one of ${sizes}.`);
}

/**
 * Copper resistance carried from 20 °C to another conductor temperature, in the unit it came in.
 *
 * Source: IEC 60028 coefficient 0.00393 /K (from memory).
 *
 * @throws {OutOfRange} when the temperature is outside −40 to 200 °C.
 * @example resistanceAt(3.3, 60) // 3.81876
 */
export function resistanceAt(resistanceAt20C: number, conductorC: number): number {
  within(conductorC, {
    what: 'Conductor temperature',
    unit: '°C',
    least: -40,
    most: 200,
    remedy: 'the straight-line coefficient holds only there',
  });
  return resistanceAt20C * (1 + COPPER_ALPHA_PER_K * (conductorC - 20));
}
