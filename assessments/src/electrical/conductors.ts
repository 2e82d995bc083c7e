import { iecOhmsPerKm } from './iec-resistance.ts';
import { within } from './out-of-range.ts';

/** Annealed copper at 20 °C, Ω·mm²/m: the 1/58 of IEC 60028 (from memory). */
export const COPPER_OHM_MM2_PER_M = 1 / 58;

/** Hard-drawn aluminium at 20 °C, Ω·mm²/m: IEC 60889 (second-hand copy). */
export const ALUMINIUM_OHM_MM2_PER_M = 0.028264;

/** Temperature coefficients of resistance at 20 °C, 1/K (IEC 60028 and IEC 60889, from memory). */
const ALPHA_PER_K = { copper: 0.00393, aluminium: 0.00403 };

/** A metal cable is made of. */
export type Metal = keyof typeof ALPHA_PER_K;

/**
 * Resistance of one flexible copper conductor by its table, at 20 °C, Ω/km.
 *
 * Source: IEC 60228 class 5, plain copper (from memory).
 *
 * @throws {OutOfRange} when the area is no size of the table.
 * @example classFiveOhmsPerKm(6) // 3.3
 */
export function classFiveOhmsPerKm(areaMm2: number): number {
  return iecOhmsPerKm(areaMm2, { strands: 'class 5', surface: 'plain' });
}

/**
 * Resistance of a solid conductor by its copper or aluminium alone, at 20 °C, Ω/km. Cable of
 * strands resists 4 to 16 % more.
 *
 * @throws {OutOfRange} when the area is not above 0.
 * @example ohmsPerKmOfArea(6, COPPER_OHM_MM2_PER_M) // 2.874
 */
export function ohmsPerKmOfArea(areaMm2: number, ohmMm2PerM: number): number {
  within(areaMm2, {
    what: 'Area',
    unit: 'mm²',
    least: 0.01,
    most: 10_000,
    remedy: 'give the cross-section of the metal',
  });
  return (1000 * ohmMm2PerM) / areaMm2;
}

/**
 * Resistance carried from 20 °C to another conductor temperature, in the unit it came in.
 *
 * Source: coefficients 0.00393 /K of IEC 60028 for copper, 0.00403 /K of IEC 60889 for aluminium
 * (from memory).
 *
 * @throws {OutOfRange} when the temperature is outside −40 to 200 °C.
 * @example resistanceAt(3.3, 60) // 3.81876
 */
export function resistanceAt(
  resistanceAt20C: number,
  conductorC: number,
  metal: Metal = 'copper',
): number {
  within(conductorC, {
    what: 'Conductor temperature',
    unit: '°C',
    least: -40,
    most: 200,
    remedy: 'the straight-line coefficient holds only there',
  });
  return resistanceAt20C * (1 + ALPHA_PER_K[metal] * (conductorC - 20));
}
