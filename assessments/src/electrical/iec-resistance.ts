import { OutOfRange } from './out-of-range.ts';

/** How a conductor is made: class 2 has few stout strands, class 5 many fine ones. */
export interface CopperMake {
  strands: 'class 2' | 'class 5';
  surface: 'plain' | 'tinned';
}

type Row = readonly [
  area: number,
  plain2: number,
  tinned2: number,
  plain5: number,
  tinned5: number,
];

/** Greatest resistance at 20 °C, mm² to Ω/km: IEC 60228:2004 tables 2 and 3 (from memory). */
const ROWS: readonly Row[] = [
  [0.5, 36, 36.7, 39, 40.1],
  [0.75, 24.5, 24.8, 26, 26.7],
  [1, 18.1, 18.2, 19.5, 20],
  [1.5, 12.1, 12.2, 13.3, 13.7],
  [2.5, 7.41, 7.56, 7.98, 8.21],
  [4, 4.61, 4.7, 4.95, 5.09],
  [6, 3.08, 3.11, 3.3, 3.39],
  [10, 1.83, 1.84, 1.91, 1.95],
  [16, 1.15, 1.16, 1.21, 1.24],
  [25, 0.727, 0.734, 0.78, 0.795],
  [35, 0.524, 0.529, 0.554, 0.565],
  [50, 0.387, 0.391, 0.386, 0.393],
  [70, 0.268, 0.27, 0.272, 0.277],
  [95, 0.193, 0.195, 0.206, 0.21],
  [120, 0.153, 0.154, 0.161, 0.164],
];

const COLUMN = {
  'class 2': { plain: 1, tinned: 2 },
  'class 5': { plain: 3, tinned: 4 },
} as const;

/** Metric sizes the table has, mm². */
export const IEC_AREAS_MM2: readonly number[] = ROWS.map(([area]) => area);

/**
 * Greatest resistance of one copper conductor at 20 °C, Ω/km.
 *
 * Source: IEC 60228:2004 tables 2 and 3 (from memory).
 *
 * @throws {OutOfRange} when the area is no size of the table.
 * @example iecOhmsPerKm(6, { strands: 'class 5', surface: 'tinned' }) // 3.39
 */
export function iecOhmsPerKm(areaMm2: number, make: CopperMake): number {
  const row = ROWS.find(([size]) => Math.abs(size - areaMm2) < 1e-6);
  if (row) return row[COLUMN[make.strands][make.surface]];
  throw new OutOfRange(
    `Cable area ${areaMm2} mm² is not a stock size; use one of ${IEC_AREAS_MM2.join(', ')}.`,
  );
}
