import { gaugeName } from './gauge.ts';
import { OutOfRange } from './out-of-range.ts';

/** Columns of the printed table. */
export type GaugeConductor = 'stranded copper' | 'solid copper' | 'aluminium';

type Row = readonly [
  gauge: number,
  circularMils: number,
  solid: number,
  stranded: number,
  aluminium: number,
];

/**
 * Gauge to printed circular mils and Ω per 1000 ft at 75 °C, uncoated: NEC chapter 9 table 8
 * (14 AWG and larger second-hand copy; 18, 16 and the solid column from memory). NaN where none
 * is carried over.
 */
const ROWS: readonly Row[] = [
  [18, 1620, 7.77, 7.95, 12.8],
  [16, 2580, 4.89, 4.99, 8.05],
  [14, 4110, 3.07, 3.14, 5.06],
  [12, 6530, 1.93, 1.98, 3.18],
  [10, 10_380, 1.21, 1.24, 2],
  [8, 16_510, 0.764, 0.778, 1.26],
  [6, 26_240, NaN, 0.491, 0.808],
  [4, 41_740, NaN, 0.308, 0.508],
  [3, 52_620, NaN, 0.245, 0.403],
  [2, 66_360, NaN, 0.194, 0.319],
  [1, 83_690, NaN, 0.154, 0.253],
  [0, 105_600, NaN, 0.122, 0.201],
  [-1, 133_100, NaN, 0.0967, 0.159],
  [-2, 167_800, NaN, 0.0766, 0.126],
  [-3, 211_600, NaN, 0.0608, 0.1],
];

const COLUMN = { 'solid copper': 2, 'stranded copper': 3, aluminium: 4 } as const;

const KM_PER_1000_FT = 0.3048;

/** Temperature the table is printed for, °C. */
export const GAUGE_TABLE_C = 75;

/**
 * Printed resistance of one conductor of a gauge at 75 °C, Ω per 1000 ft.
 *
 * Source: NEC chapter 9 table 8 (second-hand copy; 18 and 16 AWG and the solid column from
 * memory).
 *
 * @param gauge - its number: 10, 0 for 1/0, −3 for 4/0.
 * @throws {OutOfRange} when the table has no such row, or no figure in the column.
 * @example gaugeOhmsPer1000Ft(10) // 1.24
 */
export function gaugeOhmsPer1000Ft(
  gauge: number,
  conductor: GaugeConductor = 'stranded copper',
): number {
  const ohms = ROWS.find(([row]) => row === gauge)?.[COLUMN[conductor]];
  if (ohms !== undefined && Number.isFinite(ohms)) return ohms;
  throw new OutOfRange(
    `The gauge table has no ${conductor} of gauge ${gauge}; use one of ${named(conductor)}.`,
  );
}

/**
 * The same in Ω/km.
 *
 * @throws {OutOfRange} as gaugeOhmsPer1000Ft.
 * @example gaugeOhmsPerKm(10) // 4.0682
 */
export function gaugeOhmsPerKm(gauge: number, conductor?: GaugeConductor): number {
  return gaugeOhmsPer1000Ft(gauge, conductor) / KM_PER_1000_FT;
}

/**
 * Printed area of a gauge, circular mils: rounded, and for 1/0 a little above the geometry.
 *
 * @throws {OutOfRange} when the table has no such row.
 * @example printedCircularMils(0) // 105600
 */
export function printedCircularMils(gauge: number): number {
  const row = ROWS.find(([one]) => one === gauge);
  if (row) return row[1];
  throw new OutOfRange(
    `The gauge table has no gauge ${gauge}; use one of ${named('stranded copper')}.`,
  );
}

function named(conductor: GaugeConductor): string {
  const rows = ROWS.filter((row) => Number.isFinite(row[COLUMN[conductor]]));
  return rows.map(([gauge]) => gaugeName(gauge)).join(', ');
}
