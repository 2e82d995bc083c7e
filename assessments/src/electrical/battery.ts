import { within } from './out-of-range.ts';

export type BatteryKind = 'flooded' | 'agm' | 'gel';

/** A lead-acid bank as its charger sees it. Charge is a share, 0 empty to 1 full. */
export interface Battery {
  /** Open-circuit voltage when empty, V. */
  emptyV: number;
  /** Open-circuit voltage when full, V. */
  fullV: number;
  capacityAh: number;
  /** Resistance to charging that is always there, Ω. */
  baseOhms: number;
  /** Resistance that grows as the plates fill, Ω: this over (1.005 − charge). */
  fillingOhms: number;
  /** Share of the ampere-hours put in that stays. */
  efficiency: number;
}

/** Per 100 Ah and 12 V. Illustrative, fitted to no battery (from memory). */
const LEAD_ACID: Record<BatteryKind, { baseOhms: number; fillingOhms: number }> = {
  agm: { baseOhms: 0.008, fillingOhms: 0.0088 },
  flooded: { baseOhms: 0.01, fillingOhms: 0.016 },
  gel: { baseOhms: 0.009, fillingOhms: 0.014 },
};

/**
 * A healthy lead-acid bank; its resistance goes down with capacity and up with voltage.
 *
 * @throws {OutOfRange} when capacity or the number of 12 V blocks in series is beyond the model.
 */
export function leadAcid(kind: BatteryKind, capacityAh: number, blocks: number): Battery {
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
  const scale = (blocks * 100) / capacityAh;
  return {
    emptyV: 11.9 * blocks,
    fullV: 12.8 * blocks,
    capacityAh,
    baseOhms: LEAD_ACID[kind].baseOhms * scale,
    fillingOhms: LEAD_ACID[kind].fillingOhms * scale,
    efficiency: 0.9,
  };
}

/** Voltage with no current flowing, V. */
export function openCircuitV(battery: Battery, charge: number): number {
  return battery.emptyV + (battery.fullV - battery.emptyV) * charge;
}

/** Resistance between open-circuit and charging voltage, Ω. */
export function chargingOhms(battery: Battery, charge: number): number {
  return battery.baseOhms + battery.fillingOhms / (1.005 - Math.min(charge, 1));
}
