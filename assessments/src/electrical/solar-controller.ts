import { OutOfRange, within } from './out-of-range.ts';
import { bestPoint, type PanelString, stringAmps } from './panel-string.ts';
import { type WorkPoint } from './single-diode.ts';

/** What reaches the battery. */
export interface ControllerOutput {
  amps: number;
  watts: number;
}

/** A controller that steps the working voltage down. */
export interface Tracker {
  /** Share of the panel's power that gets through. */
  efficiency: number;
  /** Most current it puts out, A; Infinity for none named. */
  limitA: number;
  /** Volts the panel must stand above the battery before it works. */
  headroomV: number;
}

/**
 * Through a controller that does not track: the battery holds the panel at its own voltage, so
 * the power is battery volts times panel amps.
 *
 * @param panel - its working point as on the label.
 * @throws {OutOfRange} when the battery stands over the panel's working voltage.
 * @example withoutTracking({ volts: 18, amps: 5.5 }, 12.8) // 5.5 A, 70.4 W
 */
export function withoutTracking(panel: WorkPoint, batteryV: number): ControllerOutput {
  requireBattery(batteryV);
  if (batteryV > panel.volts) {
    throw new OutOfRange(
      `A battery at ${batteryV} V is over the panel’s ${panel.volts} V at work; the label’s amps do not hold there: use the curve of the panel, or panels in series.`,
    );
  }
  return { amps: panel.amps, watts: panel.amps * batteryV };
}

/**
 * Through a tracking controller: volts are traded for amps, less its loss.
 *
 * @param panel - its working point as on the label.
 * @throws {OutOfRange} when efficiency, limit or battery voltage are out of range, or the panel
 * does not stand high enough over the battery.
 * @example
 * withTracking({ volts: 18, amps: 5.5 }, 12.8, { efficiency: 0.95, limitA: 20, headroomV: 1 })
 * // 7.348 A, 94.05 W
 */
export function withTracking(
  panel: WorkPoint,
  batteryV: number,
  tracker: Tracker,
): ControllerOutput {
  requireBattery(batteryV);
  requireTracker(tracker);
  if (panel.volts < batteryV + tracker.headroomV) {
    throw new OutOfRange(
      `A panel at ${panel.volts} V does not stand ${tracker.headroomV} V over a battery at ${batteryV} V; a controller that steps down gives nothing: put panels in series.`,
    );
  }
  const amps = Math.min(tracker.limitA, (panel.volts * panel.amps * tracker.efficiency) / batteryV);
  return { amps, watts: amps * batteryV };
}

/**
 * The same without tracking, from the curve of the panels: what flows at the battery's voltage.
 *
 * @throws {OutOfRange} when the battery voltage is out of range.
 */
export function directFrom(string: PanelString, batteryV: number): ControllerOutput {
  requireBattery(batteryV);
  const amps = stringAmps(string, batteryV);
  return { amps, watts: amps * batteryV };
}

/**
 * The same with tracking, from the curve of the panels: the point of most power, or nothing where
 * that stands too low over the battery.
 *
 * @throws {OutOfRange} when efficiency, limit or battery voltage are out of range.
 */
export function trackedFrom(
  string: PanelString,
  batteryV: number,
  tracker: Tracker,
): ControllerOutput {
  requireBattery(batteryV);
  requireTracker(tracker);
  const point = bestPoint(string);
  return point.volts < batteryV + tracker.headroomV
    ? { amps: 0, watts: 0 }
    : withTracking(point, batteryV, tracker);
}

function requireBattery(batteryV: number): void {
  within(batteryV, {
    what: 'Battery voltage',
    unit: 'V',
    least: 6,
    most: 66,
    remedy: 'the course covers 12 V to 48 V nominal',
  });
}

function requireTracker({ efficiency, limitA, headroomV }: Tracker): void {
  within(efficiency, {
    what: 'Efficiency',
    unit: '',
    least: 0.5,
    most: 1,
    remedy: 'give it as a share; 0.95 is usual',
  });
  within(headroomV, {
    what: 'Headroom',
    unit: 'V',
    least: 0,
    most: 10,
    remedy: 'read it off the controller’s data sheet',
  });
  if (!(limitA > 0)) {
    throw new OutOfRange(
      `Output limit ${limitA} A is not above 0 A; give the controller’s rated output.`,
    );
  }
}
