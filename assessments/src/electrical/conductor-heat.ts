import { type Metal } from './conductors.ts';
import { OutOfRange, within } from './out-of-range.ts';

/** Temperature at which the straight line of resistance meets nought, °C. */
const ZERO_RESISTANCE_C = { copper: -234.5, aluminium: -238.1 };

const CONDUCTOR = {
  what: 'Conductor temperature',
  unit: '°C',
  least: -40,
  most: 250,
  remedy: 'the straight line holds only there',
};

/**
 * Resistance at one temperature over that at another, by the zero-resistance temperature. For
 * copper it agrees with the coefficient 0.00393 /K within 0.02 %; for aluminium within 1 %.
 *
 * Source: FAA AC 43.13-1B par. 11-66 (second-hand copy).
 *
 * @throws {OutOfRange} when a temperature is outside −40 to 250 °C.
 * @example heatRatio({ fromC: 20, toC: 75 }, 'copper') // 1.2161
 */
export function heatRatio(span: { fromC: number; toC: number }, metal: Metal): number {
  const zero = ZERO_RESISTANCE_C[metal];
  return (within(span.toC, CONDUCTOR) - zero) / (within(span.fromC, CONDUCTOR) - zero);
}

/**
 * Temperature of a loaded conductor, estimated, °C: the air, and of the rise at full rating the
 * root of the share of current. It errs hot.
 *
 * Source: FAA AC 43.13-1B par. 11-66 (terms second-hand, the root from memory).
 *
 * @throws {OutOfRange} when the current is above the rating, or the rating not above 0.
 * @example loadedConductorC({ airC: 50, ratedC: 200, amps: 20, ratedAmps: 26 }) // 181.6
 */
export function loadedConductorC(cable: {
  airC: number;
  ratedC: number;
  amps: number;
  ratedAmps: number;
}): number {
  const { airC, ratedC, amps, ratedAmps } = cable;
  const share = amps / ratedAmps;
  if (!(ratedAmps > 0 && share >= 0 && share <= 1)) {
    throw new OutOfRange(
      `${amps} A is not from 0 to the cable’s ${ratedAmps} A; choose a cable that carries it.`,
    );
  }
  const rise = within(ratedC, CONDUCTOR) - within(airC, CONDUCTOR);
  return airC + rise * Math.sqrt(share);
}

/**
 * Run a limit of volts allows with a warm conductor, in the unit of the run allowed at 20 °C.
 *
 * Source: FAA AC 43.13-1B par. 11-66 (second-hand copy).
 *
 * @throws {OutOfRange} when the conductor is outside −40 to 250 °C.
 * @example warmRun(15.5, 181.56, 'copper') // 9.481
 */
export function warmRun(runAt20C: number, conductorC: number, metal: Metal): number {
  return runAt20C / heatRatio({ fromC: 20, toC: conductorC }, metal);
}
