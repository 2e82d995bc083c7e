import { type Battery } from './battery-model.ts';

/**
 * What the lines of a log show. `rest`: the charger is on and gives nothing, since the battery
 * stands above what it holds. `held back`: below both its current limit and its voltage.
 */
export type Stage = 'bulk' | 'absorption' | 'float' | 'rest' | 'off' | 'held back';

/** What a staged charger is set to; voltages are at 25 °C, where it senses. */
export interface ChargerSettings {
  limitA: number;
  absorptionV: number;
  /** Held after absorption; no part where the charger rests or holds on. */
  floatV: number;
  /** Absorption ends when the current has been under this for the hold time. */
  tailA: number;
  tailHoldH: number;
  /** Where the tail is measured: its own output, or the battery's shunt. Its own when left out. */
  tailAt?: 'charger' | 'battery';
  /** Absorption lasts at least and at most so long, h; 0 and Infinity for no bound. */
  leastAbsorptionH?: number;
  longestAbsorptionH: number;
  /** What follows absorption; float when left out. */
  afterAbsorption?: 'float' | 'rest' | 'hold';
  /** Under this at the battery for a minute, float and rest give way to bulk, V. */
  restartV?: number;
  /** On top of both voltages for what the battery is off 25 °C, V; 0 for none. */
  compensationV?: number;
  /** Half output until then, h. */
  quietUntilH?: number;
  /** The limit slides to `toA` over `overH` from `fromH` on, as a hot charger's does. */
  derate?: { fromH: number; toA: number; overH: number };
  /** Resistance of the pair between charger and battery, Ω. */
  leadOhms?: number;
  /** Where the held voltage is sensed; the charger's own posts when left out. */
  sense?: 'charger' | 'battery';
  /** Stops for so long every so often to look at its source off load. */
  pauses?: { everyH: number; forH: number };
}

/** A steady load on the bank between two times. */
export interface SteadyLoad {
  amps: number;
  fromH: number;
  untilH?: number;
}

/** The vehicle's input: an alternator, its start battery and a cable to the charger. */
export interface VehicleInput {
  /** The engine runs from, until, h. */
  fromH: number;
  untilH: number;
  /** Held by the alternator at the start battery's posts while it runs, V. */
  volts: number;
  /** At the charger's input, V: taken at and above, let go below, each for the delay. */
  engageV: number;
  releaseV: number;
  delayH: number;
  /** Takes the vehicle whatever its voltage, down to what the charger can work on. */
  hasOverride: boolean;
  /** Out and back, Ω. */
  cableOhms: number;
  /** Of the charger: watts out over watts in. */
  efficiency: number;
  battery: Battery;
  /** Of the start battery at the start, a share. */
  charge: number;
}

/** A panel input that can give so much output current, less in the shade. */
export interface SolarInput {
  amps: number;
  shade?: { fromH: number; untilH: number; amps: number };
}

export interface ChargeRun {
  battery: Battery;
  /** Share charged at the start, 0 to 1. */
  charge: number;
  charger: ChargerSettings;
  load: SteadyLoad;
  /** Left out: a source that never fails. With both, the vehicle comes first. */
  vehicle?: VehicleInput;
  solar?: SolarInput;
  hours: number;
  stepS: number;
}
