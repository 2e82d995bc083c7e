import { type Battery, restV } from './battery-model.ts';
import { type ChargeRun, type VehicleInput } from './settings.ts';
import { isBetween, SAME_H } from './timetable.ts';

export type Source = 'vehicle' | 'solar' | 'mains' | 'none';

/** No charger of this kind works on less, V (common practice, no source). */
const LEAST_INPUT_V = 9;

/** Rest voltage and resistance of the start battery, engine off. */
function startBattery({ battery }: VehicleInput, charge: number): { restV: number; ohms: number } {
  return { restV: restV(battery, charge), ohms: battery.seriesOhms + battery.relaxOhms };
}

export interface InputReading {
  /** At the charger's input, V. */
  volts: number;
  amps: number;
  /** At the start battery's posts, V. */
  postV: number;
  /** Into the start battery, A. */
  batteryA: number;
  /** The engine is off and the start battery empty. */
  isFlat: boolean;
}

/**
 * The vehicle's side while the charger draws so many watts from it: constant power, so amps rise as
 * the volts fall. Where the source cannot give them the input collapses to half its open voltage.
 */
export function readInput(
  vehicle: VehicleInput,
  { hour, charge, watts }: { hour: number; charge: number; watts: number },
): InputReading {
  const isRunning = isBetween(hour, vehicle.fromH, vehicle.untilH);
  const own = startBattery(vehicle, charge);
  const openV = isRunning ? vehicle.volts : own.restV;
  const ohms = vehicle.cableOhms + (isRunning ? 0 : own.ohms);
  const volts = (openV + Math.sqrt(Math.max(0, openV * openV - 4 * watts * ohms))) / 2;
  const amps = ohms > 0 ? (openV - volts) / ohms : watts / volts;
  if (!isRunning) {
    return { volts, amps, postV: openV - amps * own.ohms, batteryA: -amps, isFlat: charge <= 0 };
  }
  const { fillingOhms, fullShare } = vehicle.battery;
  const chargingOhms = own.ohms + fillingOhms / (fullShare - charge);
  const batteryA = Math.max(0, (vehicle.volts - own.restV) / chargingOhms);
  return { volts, amps, postV: vehicle.volts, batteryA, isFlat: false };
}

/** Share of the start battery's charge gained in an hour at a current. */
export function startSlopePerH({ efficiency, capacityAh }: Battery, amps: number): number {
  return (amps > 0 ? amps * efficiency : amps) / capacityAh;
}

/** Chooses the source: the vehicle first, taken and let go only after the delay. */
export class SourceChooser {
  private readonly run: ChargeRun;
  private sinceH: number | null = null;
  source: Source;
  takenH: number | null = null;
  letGoH: number | null = null;

  constructor(run: ChargeRun) {
    this.run = run;
    this.source = run.vehicle ? this.otherwise() : run.solar ? 'solar' : 'mains';
  }

  /** Whether the vehicle's volts call for a change of source. */
  isCalling({ volts, isFlat }: InputReading): boolean {
    const { vehicle } = this.run;
    if (!vehicle) return false;
    const { hasOverride, engageV, releaseV } = vehicle;
    if (this.source === 'vehicle')
      return isFlat || volts < (hasOverride ? LEAST_INPUT_V : releaseV);
    return !isFlat && volts >= (hasOverride ? LEAST_INPUT_V : engageV);
  }

  /** The moment at which a call will have lasted; null with none. */
  get changesAtH(): number | null {
    return this.sinceH === null ? null : this.sinceH + (this.run.vehicle?.delayH ?? 0);
  }

  /** Notes what the vehicle's volts say now; true when the source has changed. */
  look(hour: number, input: InputReading): boolean {
    if (!this.isCalling(input)) {
      this.sinceH = null;
      return false;
    }
    this.sinceH ??= hour;
    if (hour < (this.changesAtH ?? Infinity) - SAME_H) return false;
    this.sinceH = null;
    if (this.source === 'vehicle') {
      this.source = this.otherwise();
      this.letGoH ??= hour;
    } else {
      this.source = 'vehicle';
      this.takenH ??= hour;
    }
    return true;
  }

  private otherwise(): Source {
    return this.run.solar ? 'solar' : 'none';
  }
}
