import { ALUMINIUM_OHM_MM2_PER_M, COPPER_OHM_MM2_PER_M, resistanceAt } from './conductors.ts';
import { circularMilsToMm2 } from './gauge.ts';
import { type CopperMake, iecOhmsPerKm } from './iec-resistance.ts';
import { gaugeOhmsPerKm, GAUGE_TABLE_C } from './gauge-resistance.ts';
import { gaugeName } from './gauge.ts';
import { within } from './out-of-range.ts';
import { areaForDrop, dropAlong } from './voltage-drop.ts';

/** A resistivity with the name it goes by; a sum that uses one must say which. */
export interface Resistivity {
  is: string;
  ohmMm2PerM: number;
}

/** Something found, and the figures it was found by. */
export type By<Found> = Found & { by: string };

const M_PER_FT = 0.3048;

/** Ω·mm²/m of one Ω·cmil/ft. */
const OHM_MM2_PER_M_OF_MIL_FOOT = circularMilsToMm2(1) / M_PER_FT;

/** Circular-mil constant of small craft practice, Ω·cmil/ft: ABYC E-11 (from memory). */
export const SMALL_CRAFT_K = 10.75;

/** A constant in Ω·cmil/ft as Ω·mm²/m. */
export function ofMilFoot(ohmCircularMilPerFt: number): number {
  return ohmCircularMilPerFt * OHM_MM2_PER_M_OF_MIL_FOOT;
}

/** Constants in use for one metal or the other. They differ by up to 9 %: none is a misprint. */
export const RESISTIVITIES = {
  // IEC 60028 (from memory).
  annealedCopper: { is: 'annealed copper at 20 °C, 1/58', ohmMm2PerM: COPPER_OHM_MM2_PER_M },
  // ISO 10133 annex (formula second-hand, its origin from memory).
  metricSmallCraft: { is: 'metric small craft rule, 0.0164', ohmMm2PerM: 0.0164 },
  // ABYC E-11 (from memory).
  milFootSmallCraft: { is: 'circular-mil rule, K = 10.75', ohmMm2PerM: ofMilFoot(SMALL_CRAFT_K) },
  // CRC Handbook by way of a textbook (read): pure copper, not cable.
  pureCopper: { is: 'pure copper at 20 °C, 10.09 Ω·cmil/ft', ohmMm2PerM: ofMilFoot(10.09) },
  // IEC 60889 (second-hand copy).
  aluminium: { is: 'aluminium at 20 °C, 0.028264', ohmMm2PerM: ALUMINIUM_OHM_MM2_PER_M },
} as const satisfies Record<string, Resistivity>;

/**
 * Drop of a pair by the cable's own table, V: the route that decides.
 *
 * Source: IEC 60228 (from memory), warmed by 0.00393 /K where a temperature is given.
 *
 * @param run - metres one way; `conductorC` is 20 °C unless given.
 * @throws {OutOfRange} when the size is not in the table, or a figure out of the trade's range.
 * @example dropByTable({ areaMm2: 10, lengthM: 5, amps: 20 }).dropV // 0.382
 */
export function dropByTable(
  run: { areaMm2: number; lengthM: number; amps: number; conductorC?: number },
  make: CopperMake = { strands: 'class 5', surface: 'plain' },
): By<{ dropV: number }> {
  const conductorC = run.conductorC ?? 20;
  const ohmsPerKm = resistanceAt(iecOhmsPerKm(run.areaMm2, make), conductorC);
  return {
    dropV: dropAlong({ ...run, ohmsPerKm }),
    by: `IEC 60228 ${make.strands}, ${make.surface}, ${short(ohmsPerKm)} Ω/km at ${conductorC} °C`,
  };
}

/**
 * Drop of a pair of gauges by the printed table at 75 °C, V.
 *
 * Source: NEC chapter 9 table 8 (second-hand copy).
 *
 * @throws {OutOfRange} when the gauge is not in the table, or a figure out of the trade's range.
 * @example dropByGaugeTable({ gauge: 10, lengthM: 5, amps: 20 }).dropV // 0.8136
 */
export function dropByGaugeTable(run: {
  gauge: number;
  lengthM: number;
  amps: number;
}): By<{ dropV: number }> {
  const ohmsPerKm = gaugeOhmsPerKm(run.gauge);
  return {
    dropV: dropAlong({ ...run, ohmsPerKm }),
    by: `NEC table 8, ${gaugeName(run.gauge)} AWG stranded copper, ${short(ohmsPerKm)} Ω/km at ${GAUGE_TABLE_C} °C`,
  };
}

/**
 * Drop of a pair by its area and a resistivity alone, V.
 *
 * @throws {OutOfRange} when a figure is out of the trade's range.
 * @example dropByResistivity({ areaMm2: 1.5, lengthM: 11, amps: 1.6 }, RESISTIVITIES.metricSmallCraft)
 */
export function dropByResistivity(
  run: { areaMm2: number; lengthM: number; amps: number },
  metal: Resistivity,
): By<{ dropV: number }> {
  const areaMm2 = within(run.areaMm2, {
    what: 'Area',
    unit: 'mm²',
    least: 0.01,
    most: 10_000,
    remedy: 'give the cross-section of the metal',
  });
  const ohmsPerKm = (1000 * metal.ohmMm2PerM) / areaMm2;
  return { dropV: dropAlong({ ...run, ohmsPerKm }), by: metal.is };
}

/**
 * Copper that keeps a pair within its limit by a resistivity, mm².
 *
 * @throws {OutOfRange} when the limit is not positive, or a figure out of the trade's range.
 */
export function areaByResistivity(
  run: { lengthM: number; amps: number; limitV: number },
  metal: Resistivity,
): By<{ areaMm2: number }> {
  return { areaMm2: areaForDrop({ ...run, ohmMm2PerM: metal.ohmMm2PerM }), by: metal.is };
}

/**
 * Circular mils that keep a run within its limit: K × I × L ÷ E.
 *
 * Source: ABYC E-11 (formula from memory).
 *
 * @param run - `loopFt` is out and back, in feet.
 * @throws {OutOfRange} when the limit is not positive, or a figure out of the trade's range.
 * @example circularMilsForDrop({ loopFt: 21, amps: 10, limitV: 0.36 }).circularMils // 6270.8
 */
export function circularMilsForDrop(
  run: { loopFt: number; amps: number; limitV: number },
  k = SMALL_CRAFT_K,
): By<{ circularMils: number }> {
  const lengthM = (run.loopFt * M_PER_FT) / 2;
  const areaMm2 = areaForDrop({ ...run, lengthM, ohmMm2PerM: ofMilFoot(k) });
  return { circularMils: areaMm2 / circularMilsToMm2(1), by: `K = ${k} Ω·cmil/ft` };
}

/**
 * Temperature at which annealed copper has such a resistivity, °C: what a constant takes for
 * granted.
 *
 * @example copperHasItAtC(ofMilFoot(10.75)) // 29.3
 */
export function copperHasItAtC(ohmMm2PerM: number): number {
  const perKelvin = resistanceAt(COPPER_OHM_MM2_PER_M, 21) - COPPER_OHM_MM2_PER_M;
  return 20 + (ohmMm2PerM - COPPER_OHM_MM2_PER_M) / perKelvin;
}

function short(figure: number): string {
  return String(Number(figure.toPrecision(4)));
}
