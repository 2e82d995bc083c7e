import { within } from './out-of-range.ts';

export type ChargeChemistry = 'flooded' | 'agm' | 'gel' | 'lithium';

interface VoltageRange {
  least: number;
  most: number;
}

/** Volts of a cell at 25 °C. */
interface CellVoltages {
  cellsIn12V: number;
  absorption: VoltageRange;
  float: VoltageRange;
}

/** Ranges of general handbooks (from memory). The battery maker's figure goes first. */
const CELL_VOLTAGES: Readonly<Record<ChargeChemistry, CellVoltages>> = {
  flooded: {
    cellsIn12V: 6,
    absorption: { least: 2.4, most: 2.47 },
    float: { least: 2.2, most: 2.27 },
  },
  agm: {
    cellsIn12V: 6,
    absorption: { least: 2.37, most: 2.45 },
    float: { least: 2.25, most: 2.3 },
  },
  gel: {
    cellsIn12V: 6,
    absorption: { least: 2.33, most: 2.37 },
    float: { least: 2.25, most: 2.3 },
  },
  lithium: {
    cellsIn12V: 4,
    absorption: { least: 3.5, most: 3.65 },
    float: { least: 3.33, most: 3.4 },
  },
};

/**
 * Range in which a stage's voltage lies at 25 °C, V. A range to check a setting by, never a set
 * point: the battery maker's figure goes first (from memory).
 *
 * @param blocks - 12 V blocks in series, 1 to 4.
 * @throws {OutOfRange} when there are more.
 */
export function chargeVoltageRange(
  chemistry: ChargeChemistry,
  stage: 'absorption' | 'float',
  blocks = 1,
): VoltageRange {
  within(blocks, {
    what: 'Blocks in series',
    unit: '',
    least: 1,
    most: 4,
    remedy: 'the table covers 12 V to 48 V nominal',
  });
  const { cellsIn12V, [stage]: cell } = CELL_VOLTAGES[chemistry];
  const cells = cellsIn12V * blocks;
  return { least: cell.least * cells, most: cell.most * cells };
}

/**
 * A charging voltage at the battery's temperature, V: so many mV for each cell and each kelvin off
 * 25 °C. Texts differ (-3 to -5 mV; one says -5 in its older and -3.9 in its newer edition): take
 * the maker's. A lithium battery has none.
 *
 * @param setting - volts 2 to 70, cells 1 to 24, millivolts -6 to 0, battery -20 to 50 °C.
 * @throws {OutOfRange} when a figure lies outside.
 */
export function compensatedV(setting: {
  volts: number;
  cells: number;
  mvPerKelvinCell: number;
  celsius: number;
}): number {
  const { volts, cells, mvPerKelvinCell, celsius } = setting;
  within(volts, {
    what: 'Charging voltage',
    unit: 'V',
    least: 2,
    most: 70,
    remedy: 'give the setting for 25 °C',
  });
  within(cells, {
    what: 'Cells in series',
    unit: '',
    least: 1,
    most: 24,
    remedy: 'there are six in 12 V of lead-acid',
  });
  within(mvPerKelvinCell, {
    what: 'Compensation',
    unit: 'mV/K for each cell',
    least: -6,
    most: 0,
    remedy: 'it is not above 0: a cold battery needs more volts',
  });
  within(celsius, {
    what: 'Battery temperature',
    unit: '°C',
    least: -20,
    most: 50,
    remedy: 'measure at the battery, not in the air',
  });
  return volts + (cells * mvPerKelvinCell * (celsius - 25)) / 1000;
}

/** A lithium iron phosphate battery takes no charge under this, °C (common practice, from memory). */
const LEAST_LITHIUM_C = 0;

/**
 * Whether a battery may be charged at a temperature. Under 0 °C metal plates out inside a lithium
 * iron phosphate cell at any current; the maker's figure goes first (common practice, from memory).
 */
export function mayCharge(chemistry: ChargeChemistry, celsius: number): boolean {
  return chemistry !== 'lithium' || celsius >= LEAST_LITHIUM_C;
}
