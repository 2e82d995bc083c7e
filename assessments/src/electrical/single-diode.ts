import { OutOfRange, within } from './out-of-range.ts';
import { risingRoot } from './rising-root.ts';

/** Constants of the published 57 mm cell fit; the 2019 SI values differ in the seventh digit. */
const BOLTZMANN_J_PER_K = 1.3806503e-23;
const ELEMENTARY_CHARGE_C = 1.60217646e-19;
const ZERO_C_IN_K = 273.15;

/** A group of cells in series as one current source, one diode, one series and one shunt resistance. */
export interface CellGroup {
  /** Current the light makes, A; in proportion to the light. */
  lightA: number;
  /** Saturation current of the diode, A. */
  saturationA: number;
  /** Ideality × cells × kT/q, V: the diode's current grows e-fold in it. */
  slopeV: number;
  seriesOhms: number;
  shuntOhms: number;
}

/** One point of a current-voltage curve. */
export interface WorkPoint {
  volts: number;
  amps: number;
}

/**
 * A module of 36 cells, sold for 12 V batteries: 100 W, 21.8 V open, 17.9 V at work.
 * Illustrative, no product; the figures were worked in three outside programs.
 */
export const GENERIC_36_CELLS: CellGroup = {
  lightA: 6,
  saturationA: 1e-9,
  slopeV: 0.97,
  seriesOhms: 0.2,
  shuntOhms: 200,
};

/**
 * The voltage in which a group's diode current grows e-fold, V: ideality × cells × kT/q.
 *
 * @throws {OutOfRange} when ideality, cells or temperature are no silicon cell's.
 * @example diodeSlopeV({ ideality: 1.4811836, cells: 1, cellC: 33 }) // 0.039077
 */
export function diodeSlopeV(group: { ideality: number; cells: number; cellC: number }): number {
  within(group.ideality, {
    what: 'Ideality',
    unit: '',
    least: 1,
    most: 2,
    remedy: 'a silicon cell lies between 1 and 2',
  });
  within(group.cells, {
    what: 'Cells in series',
    unit: '',
    least: 1,
    most: 200,
    remedy: 'count the cells of the group',
  });
  within(group.cellC, {
    what: 'Cell temperature',
    unit: '°C',
    least: -40,
    most: 100,
    remedy: 'give the temperature of the cells',
  });
  const kelvin = group.cellC + ZERO_C_IN_K;
  return (group.ideality * group.cells * BOLTZMANN_J_PER_K * kelvin) / ELEMENTARY_CHARGE_C;
}

/**
 * Current of a group at a voltage across its terminals, A; below zero past the open-circuit voltage.
 *
 * Source: single-diode equation as in the fitting literature of Easwarakhanthan et al.,
 * Int. J. Solar Energy 4 (1986).
 *
 * @throws {OutOfRange} when a parameter is not physical or the voltage is over twice the open one.
 * @example ampsAt(GENERIC_36_CELLS, 17) // 5.7748
 */
export function ampsAt(group: CellGroup, volts: number): number {
  requireGroup(group);
  const openV = openVolts(group);
  within(volts, {
    what: 'Voltage across the panel',
    unit: 'V',
    least: -2 * openV - 1,
    most: 2 * openV + 1,
    remedy: 'a panel works between 0 V and its open-circuit voltage',
  });
  const diodeV = risingRoot((at) => at - cellAmps(group, at) * group.seriesOhms - volts, openV + 1);
  return cellAmps(group, diodeV);
}

/**
 * Open-circuit voltage of a group, V; 0 in the dark.
 *
 * @throws {OutOfRange} when a parameter is not physical.
 * @example openVolts(GENERIC_36_CELLS) // 21.8218
 */
export function openVolts(group: CellGroup): number {
  requireGroup(group);
  if (group.lightA === 0) return 0;
  return risingRoot((diodeV) => -cellAmps(group, diodeV), group.slopeV);
}

/** Beyond this exponent a current is astronomic, and soon no number. */
const MOST_EXPONENT = 600;

/** Current of the cells when the diode inside sees such a voltage, A. */
export function cellAmps(group: CellGroup, diodeV: number): number {
  const exponent = Math.min(diodeV / group.slopeV, MOST_EXPONENT);
  const diodeA = group.saturationA * Math.expm1(exponent);
  return group.lightA - diodeA - diodeV / group.shuntOhms;
}

/**
 * The same group with fewer cells or in weaker light.
 *
 * @param by - `cells` and `light` are shares of the whole, above 0 and from 0 up to 1.5.
 * @throws {OutOfRange} when a share is out of range.
 * @example shareOf(GENERIC_36_CELLS, { cells: 0.5, light: 0.3 }) // one half of it, shaded
 */
export function shareOf(group: CellGroup, by: { cells: number; light: number }): CellGroup {
  within(by.cells, {
    what: 'Share of the cells',
    unit: '',
    least: 0.01,
    most: 1,
    remedy: 'give the part of the panel behind one bypass diode',
  });
  within(by.light, {
    what: 'Share of full light',
    unit: '',
    least: 0,
    most: 1.5,
    remedy: 'give the light as a share of 1000 W/m²',
  });
  return {
    lightA: group.lightA * by.light,
    saturationA: group.saturationA,
    slopeV: group.slopeV * by.cells,
    seriesOhms: group.seriesOhms * by.cells,
    shuntOhms: group.shuntOhms * by.cells,
  };
}

export function requireGroup(group: CellGroup): void {
  const positive = [group.saturationA, group.slopeV, group.shuntOhms].every(
    (one) => Number.isFinite(one) && one > 0,
  );
  const none = [group.lightA, group.seriesOhms].every((one) => Number.isFinite(one) && one >= 0);
  if (positive && none) return;
  throw new OutOfRange(
    `Panel data ${JSON.stringify(group)} are not physical; saturation current, slope and shunt resistance must be above 0, light current and series resistance at least 0.`,
  );
}
