import { OutOfRange, within } from './out-of-range.ts';

/** An alternator by its plate and by what heat and speed leave of it; factors are given data. */
export interface Alternator {
  ratedA: number;
  /** Hot output over rated, 0.3 to 1. */
  hotFactor: number;
  /** Output at the engine's speed over full, 0.2 to 1; 1 on the road. */
  speedFactor: number;
}

/**
 * What an alternator gives hot and at a speed, A. About 0.70 hot and 0.50 to 0.60 at idle are seen
 * (from memory; common practice, no source): give the figures of the case.
 *
 * @throws {OutOfRange} when a figure lies outside.
 */
export function alternatorAmps({ ratedA, hotFactor, speedFactor }: Alternator): number {
  within(ratedA, {
    what: 'Alternator rating',
    unit: 'A',
    least: 10,
    most: 500,
    remedy: 'read its plate',
  });
  const remedy = 'give it as a share, 0.7 for 70 %';
  within(hotFactor, { what: 'Hot factor', unit: '', least: 0.3, most: 1, remedy });
  within(speedFactor, { what: 'Speed factor', unit: '', least: 0.2, most: 1, remedy });
  return ratedA * hotFactor * speedFactor;
}

/** What the vehicle's own needs leave for charging, A; under 0 its battery makes up the rest. */
export function leftForCharging(alternator: Alternator, vehicleA: number): number {
  return alternatorAmps(alternator) - vehicleA;
}

/**
 * Whether chargers on one alternator, by their input amps, stay within a share of its hot output:
 * about one half is common practice (no source).
 */
export function chargersOnAlternator(
  alternator: Alternator,
  chargers: { inputsA: readonly number[]; share: number },
): { drawnA: number; allowedA: number; isWithin: boolean } {
  const drawnA = chargers.inputsA.reduce((sum, amps) => sum + amps, 0);
  const allowedA = alternatorAmps({ ...alternator, speedFactor: 1 }) * chargers.share;
  return { drawnA, allowedA, isWithin: drawnA <= allowedA };
}

/** What a DC-DC charger gives and works at. */
export interface ChargerOutput {
  amps: number;
  volts: number;
  /** Watts out over watts in, 0.5 to 1. */
  efficiency: number;
}

/** Watts a charger takes in. */
export function inputWatts({ amps, volts, efficiency }: ChargerOutput): number {
  within(efficiency, {
    what: 'Efficiency',
    unit: 'of the watts in',
    least: 0.5,
    most: 1,
    remedy: 'give it as a share, 0.92 for 92 %',
  });
  return (amps * volts) / efficiency;
}

/** Input amps at the volts measured at its input: constant power, so amps rise as volts fall. */
export function inputAmps(output: ChargerOutput, inputV: number): number {
  within(inputV, {
    what: 'Input voltage',
    unit: 'V',
    least: 6,
    most: 70,
    remedy: 'measure it at the charger’s input under load',
  });
  return inputWatts(output) / inputV;
}

/**
 * Volts and amps at the end of a resistance that feeds a constant power: of the two solutions the
 * higher voltage, U = (E + √(E² − 4PR))/2 (identity).
 *
 * @param feed - open voltage above 0; Ω 0 to 10; watts not under 0.
 * @throws {OutOfRange} when the source cannot give the power: E² < 4PR.
 */
export function feedConstantPower(feed: { openV: number; ohms: number; watts: number }): {
  volts: number;
  amps: number;
} {
  const { openV, ohms, watts } = feed;
  const root = openV * openV - 4 * watts * ohms;
  if (!(root >= 0)) {
    const most = ((openV * openV) / (4 * ohms)).toFixed(0);
    throw new OutOfRange(
      `${watts} W is over the ${most} W that ${openV} V behind ${ohms} Ω can give; lower the resistance.`,
    );
  }
  const volts = (openV + Math.sqrt(root)) / 2;
  return { volts, amps: watts / volts };
}

/**
 * Whether a charger takes its vehicle input: at the engagement level, or below it on a run signal
 * or with its override. A variable-voltage alternator may stay under the level on the road, so the
 * charger needs the run signal (common practice, no source).
 */
export function isEngaged(input: {
  volts: number;
  engageV: number;
  hasRunSignal: boolean;
  hasOverride: boolean;
}): boolean {
  return input.hasRunSignal || input.hasOverride || input.volts >= input.engageV;
}

/**
 * Hours in which a steady current takes a share out of a battery: the override left on, engine off.
 *
 * @throws {OutOfRange} when the share is not above 0 to 1 or the current not above 0.
 */
export function hoursToTake(capacityAh: number, share: number, amps: number): number {
  within(share, {
    what: 'Share taken',
    unit: 'of the capacity',
    least: 0.01,
    most: 1,
    remedy: 'give it as a share, 0.5 for half',
  });
  within(amps, {
    what: 'Current',
    unit: 'A',
    least: 0.01,
    most: 1000,
    remedy: 'give what is drawn with the engine off',
  });
  return (capacityAh * share) / amps;
}
