import { OutOfRange, within } from './out-of-range.ts';
import { type WorkPoint } from './single-diode.ts';

/** Working voltages further apart than this do not meet on one controller input. */
const MATCHED_SHARE = 0.05;

/**
 * Panels in series at their working points: volts add; the smallest current is the most that
 * flows through all of them (an upper bound where bypass diodes do not carry).
 *
 * @throws {OutOfRange} when there is no panel, or one has no positive voltage and current.
 * @example inSeries([{ volts: 18, amps: 5.5 }, { volts: 18, amps: 8 }]) // 36 V, 5.5 A
 */
export function inSeries(panels: readonly WorkPoint[]): WorkPoint {
  requirePanels(panels);
  const volts = panels.reduce((sum, panel) => sum + panel.volts, 0);
  return { volts, amps: Math.min(...panels.map(({ amps }) => amps)) };
}

/**
 * Panels or strings in parallel at their working points: amps add at one voltage.
 *
 * @throws {OutOfRange} when their working voltages are more than 5 % apart (common practice, no
 * source), or there is no panel.
 * @example inParallel([{ volts: 18, amps: 5.5 }, { volts: 18, amps: 8 }]) // 18 V, 13.5 A
 */
export function inParallel(strings: readonly WorkPoint[]): WorkPoint {
  requirePanels(strings);
  const all = strings.map(({ volts }) => volts);
  const [least, most] = [Math.min(...all), Math.max(...all)];
  if (most > least * (1 + MATCHED_SHARE)) {
    throw new OutOfRange(
      `Strings of ${least} V and ${most} V in parallel do not share a working voltage within 5 %; give each its own controller.`,
    );
  }
  return { volts: least, amps: strings.reduce((sum, string) => sum + string.amps, 0) };
}

/**
 * Most panels in one string whose cold open-circuit voltage stays within a controller's limit; 0
 * when not even one does.
 *
 * @param string - `coldOpenV` of one panel at the lowest expected temperature.
 * @throws {OutOfRange} when a voltage is not above 0 V.
 * @example mostInSeries({ coldOpenV: 24.31, limitV: 50 }) // 2
 */
export function mostInSeries(string: { coldOpenV: number; limitV: number }): number {
  requireVolts(string.coldOpenV, 'Cold open-circuit voltage');
  requireVolts(string.limitV, 'Controller’s input limit');
  return Math.floor(string.limitV / string.coldOpenV + 1e-9);
}

/**
 * Volts left between a string's cold open-circuit voltage and the controller's input limit;
 * below zero the controller is destroyed on a cold bright morning.
 *
 * @throws {OutOfRange} when a voltage is not above 0 V or no panel is counted.
 * @example inputMarginV({ coldOpenV: 24.31, inSeries: 2, limitV: 50 }) // 1.38
 */
export function inputMarginV(string: {
  coldOpenV: number;
  inSeries: number;
  limitV: number;
}): number {
  requireVolts(string.coldOpenV, 'Cold open-circuit voltage');
  requireVolts(string.limitV, 'Controller’s input limit');
  within(string.inSeries, {
    what: 'Panels in series',
    unit: '',
    least: 1,
    most: 100,
    remedy: 'count the panels of one string',
  });
  return string.limitV - string.coldOpenV * string.inSeries;
}

/** Sun over its rated strength, and hours of it on end: 1.25 × 1.25. */
const PV_FACTOR = 1.5625;

/**
 * Current the conductors and the fuse of a panel circuit are chosen for, A: 1.25 for bright sun
 * times 1.25 for hours of it.
 *
 * Source: NEC 690.8 (from memory). Your local code decides.
 *
 * @throws {OutOfRange} when the short-circuit current or the number of strings is out of range.
 * @example panelCircuitAmps({ shortA: 6, strings: 1 }) // 9.375
 */
export function panelCircuitAmps(circuit: { shortA: number; strings: number }): number {
  within(circuit.shortA, {
    what: 'Short-circuit current',
    unit: 'A',
    least: 0,
    most: 50,
    remedy: 'read it off the label of one panel',
  });
  within(circuit.strings, {
    what: 'Strings in parallel',
    unit: '',
    least: 1,
    most: 20,
    remedy: 'count the strings that feed the conductor',
  });
  return circuit.shortA * circuit.strings * PV_FACTOR;
}

function requireVolts(volts: number, what: string): void {
  within(volts, { what, unit: 'V', least: 0.1, most: 1500, remedy: 'give it in volts, above 0' });
}

function requirePanels(panels: readonly WorkPoint[]): void {
  if (panels.length === 0) throw new OutOfRange('No panel is given; give at least one.');
  for (const { volts, amps } of panels) {
    requireVolts(volts, 'Working voltage');
    within(amps, {
      what: 'Working current',
      unit: 'A',
      least: 0,
      most: 50,
      remedy: 'read it off the label',
    });
  }
}
