import { type ChargeChemistry, mayCharge } from '../charge-voltage.ts';
import { within } from '../out-of-range.ts';

export type BatteryKind = ChargeChemistry;

/**
 * A battery as its charger sees it: a rest voltage by charge, a resistance that acts at once, and
 * one relaxation pair. Under a steady current I the pair's voltage goes to I times its resistance
 * with one time constant. Charge is a share, 0 empty to 1 full.
 */
export interface Battery {
  /** Rest voltage by charge: shares from 0 to 1, rising, and the volts at each; straight between. */
  restShares: readonly number[];
  restVolts: readonly number[];
  capacityAh: number;
  /** Acts at once, Ω. */
  seriesOhms: number;
  /** Of the pair, charging: this over (full share − charge), Ω. Grows as the plates fill. */
  fillingOhms: number;
  fullShare: number;
  /** Of the pair whichever way the current flows, Ω. */
  relaxOhms: number;
  /** Time constant of the pair, s. */
  relaxS: number;
  /** Share of the ampere-hours put in that stays. */
  efficiency: number;
  /** Opens to charging when the cells reach this, and closes again when they are back, V. */
  protection?: { opensV: number; closesV: number };
  /** Too cold to take a charge at all. */
  refusesCharge?: boolean;
}

/** What a battery is, and what has become of it. */
export interface BatteryPlate {
  kind: BatteryKind;
  capacityAh: number;
  /** 12 V blocks in series, 1 to 4. */
  blocks: number;
  /** 25 when left out. */
  celsius?: number;
  /** Shares of the new battery's: what is left of its capacity, what its resistance has grown to. */
  aged?: { capacity: number; resistance: number };
}

/** Per 100 Ah and 12 V. Illustrative, fitted to no battery (from memory). */
interface Chemistry {
  shares: readonly number[];
  volts: readonly number[];
  seriesOhms: number;
  fillingOhms: number;
  fullShare: number;
  relaxOhms: number;
  relaxS: number;
  efficiency: number;
}

const LEAD_ACID = {
  shares: [0, 1],
  volts: [11.9, 12.8],
  fullShare: 1.005,
  relaxS: 240,
  efficiency: 0.9,
};

const CHEMISTRY: Record<BatteryKind, Chemistry> = {
  agm: { ...LEAD_ACID, seriesOhms: 0.005, relaxOhms: 0.003, fillingOhms: 0.0088 },
  flooded: { ...LEAD_ACID, seriesOhms: 0.006, relaxOhms: 0.004, fillingOhms: 0.016 },
  gel: { ...LEAD_ACID, seriesOhms: 0.005, relaxOhms: 0.004, fillingOhms: 0.014 },
  lithium: {
    shares: [0, 0.05, 0.1, 0.2, 0.4, 0.6, 0.8, 0.95, 1],
    volts: [11, 12.5, 12.95, 13.1, 13.2, 13.25, 13.33, 13.42, 13.6],
    seriesOhms: 0.006,
    fillingOhms: 0.0003,
    fullShare: 1.001,
    relaxOhms: 0.004,
    relaxS: 240,
    efficiency: 0.99,
  },
};

/** Resistance grows by so much of itself for each kelvin under 25 °C, and falls above (from memory). */
const COLD_PER_K = 0.014;
const LEAST_TEMPERATURE_FACTOR = 0.7;
/** Cells in a 12 V block. */
const CELLS: Record<BatteryKind, number> = { agm: 6, flooded: 6, gel: 6, lithium: 4 };

/** Cells in series of so many 12 V blocks. */
export function cellsIn(kind: BatteryKind, blocks: number): number {
  return CELLS[kind] * blocks;
}

/**
 * The model of a bank; its resistances go down with capacity and up with voltage, cold and age.
 * A lithium bank under 0 °C takes no charge (common practice, from memory).
 *
 * @throws {OutOfRange} when capacity, blocks, temperature or age is beyond the model.
 */
export function batteryModel(plate: BatteryPlate): Battery {
  requirePlate(plate);
  const { kind, blocks, celsius = 25, aged = { capacity: 1, resistance: 1 } } = plate;
  const { shares, volts, ...chemistry } = CHEMISTRY[kind];
  const cold = Math.max(LEAST_TEMPERATURE_FACTOR, 1 + COLD_PER_K * (25 - celsius));
  const scale = ((blocks * 100) / plate.capacityAh) * cold * aged.resistance;
  return {
    ...chemistry,
    restShares: shares,
    restVolts: volts.map((volt) => volt * blocks),
    capacityAh: plate.capacityAh * aged.capacity,
    seriesOhms: chemistry.seriesOhms * scale,
    fillingOhms: chemistry.fillingOhms * scale,
    relaxOhms: chemistry.relaxOhms * scale,
    refusesCharge: !mayCharge(kind, celsius),
  };
}

/** Voltage at rest, V. */
export function restV({ restShares, restVolts }: Battery, charge: number): number {
  let upper = 1;
  while (upper < restShares.length - 1 && charge > (restShares[upper] ?? 1)) upper += 1;
  const [from = 0, to = 1] = [restShares[upper - 1], restShares[upper]];
  const [low = NaN, high = NaN] = [restVolts[upper - 1], restVolts[upper]];
  return low + ((high - low) * (charge - from)) / (to - from);
}

/** Resistance of the relaxation pair, Ω: only a charge meets what grows as the plates fill. */
export function pairOhms(battery: Battery, charge: number, isCharging: boolean): number {
  const { relaxOhms, fillingOhms, fullShare } = battery;
  return isCharging ? relaxOhms + fillingOhms / (fullShare - Math.min(charge, 1)) : relaxOhms;
}

function requirePlate({ capacityAh, blocks, celsius = 25, aged }: BatteryPlate): void {
  within(capacityAh, {
    what: 'Battery capacity',
    unit: 'Ah',
    least: 20,
    most: 2000,
    remedy: 'give the capacity of the whole bank at its 20-hour rate',
  });
  within(blocks, {
    what: 'Blocks in series',
    unit: '',
    least: 1,
    most: 4,
    remedy: 'the model covers 12 V to 48 V nominal',
  });
  within(celsius, {
    what: 'Battery temperature',
    unit: '°C',
    least: -20,
    most: 50,
    remedy: 'the model covers a battery in use',
  });
  within(aged?.capacity ?? 1, {
    what: 'Capacity left',
    unit: 'of new',
    least: 0.1,
    most: 1,
    remedy: 'give it as a share of the new battery’s',
  });
  within(aged?.resistance ?? 1, {
    what: 'Resistance of the aged battery',
    unit: 'times new',
    least: 1,
    most: 10,
    remedy: 'give it as a multiple of the new battery’s',
  });
}
