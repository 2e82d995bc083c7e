import { OutOfRange, within } from './out-of-range.ts';

/** Lowest temperature of each band, °C, and the factor on the open-circuit voltage at 25 °C. */
const COLD_FACTORS: readonly (readonly [lowestC: number, factor: number])[] = [
  [20, 1.02],
  [15, 1.04],
  [10, 1.06],
  [5, 1.08],
  [0, 1.1],
  [-5, 1.12],
  [-10, 1.14],
  [-15, 1.16],
  [-20, 1.18],
  [-25, 1.2],
  [-30, 1.21],
  [-35, 1.23],
  [-40, 1.25],
];

/** Temperature panels are rated at, °C (IEC 60904-3, from memory). */
const RATED_C = 25;

const COLD = {
  what: 'Lowest temperature',
  unit: '°C',
  least: -40,
  most: 24,
  remedy: 'the table runs from 24 °C down to −40 °C; use the maker’s coefficient outside it',
};

/**
 * Factor on the open-circuit voltage of a silicon panel at the lowest expected temperature, by
 * table. Bands are whole degrees: −6 to −10 °C is one band.
 *
 * Source: NEC table 690.7(A): 4 to −40 °C from a second-hand copy, 24 to 5 °C from memory. The
 * maker's own coefficient goes first where it is given.
 *
 * @throws {OutOfRange} above 24 °C or below −40 °C.
 * @example coldFactor(-10) // 1.14
 */
export function coldFactor(lowestC: number): number {
  const celsius = within(lowestC, COLD);
  const band = COLD_FACTORS.find(([edgeC]) => celsius >= edgeC - 1e-9);
  if (band) return band[1];
  throw new OutOfRange(`No band for ${lowestC} °C; ${COLD.remedy}.`);
}

/**
 * Open-circuit voltage of one panel at a cell temperature, by the maker's coefficient, V.
 *
 * @param panel - `percentPerK` is the coefficient as printed, such as −0.30 %/K, below zero.
 * @throws {OutOfRange} when the coefficient is not between −1 and 0 %/K, or the cell temperature
 * not between −40 and 100 °C.
 * @example openVoltsAt({ ratedOpenV: 22, percentPerK: -0.3, cellC: -10 }) // 24.31
 */
export function openVoltsAt(panel: {
  ratedOpenV: number;
  percentPerK: number;
  cellC: number;
}): number {
  within(panel.ratedOpenV, {
    what: 'Open-circuit voltage',
    unit: 'V',
    least: 0,
    most: 1500,
    remedy: 'read it off the label, at 25 °C',
  });
  within(panel.percentPerK, {
    what: 'Voltage coefficient',
    unit: '%/K',
    least: -1,
    most: 0,
    remedy: 'give it as printed, in per cent for each kelvin; silicon loses volts as it warms',
  });
  within(panel.cellC, {
    what: 'Cell temperature',
    unit: '°C',
    least: -40,
    most: 100,
    remedy: 'give the temperature of the cells',
  });
  return panel.ratedOpenV * (1 + (panel.percentPerK / 100) * (panel.cellC - RATED_C));
}
