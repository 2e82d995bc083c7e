import { OutOfRange } from './out-of-range.ts';
import { risingRoot } from './rising-root.ts';
import {
  ampsAt,
  type CellGroup,
  cellAmps,
  openVolts,
  requireGroup,
  type WorkPoint,
} from './single-diode.ts';

/** A bypass diode as the outside circuit program was given it (from memory): 0.6 V at 6 A. */
const BYPASS_SATURATION_A = 1e-6;
const BYPASS_SLOPE_V = 0.04;

/** Groups of cells in series, each behind its own bypass diode or none. */
export interface PanelString {
  groups: readonly CellGroup[];
  hasBypass: boolean;
}

/**
 * Voltage of a string at a current through it, V. A group in the shade that cannot carry the
 * current is passed by its bypass diode and costs about 0.6 V.
 *
 * @throws {OutOfRange} when the string has no group or the current is below zero.
 * @example stringVolts({ groups: [GENERIC_36_CELLS], hasBypass: true }, 0) // 21.8218
 */
export function stringVolts(string: PanelString, amps: number): number {
  requireString(string);
  if (!Number.isFinite(amps) || amps < 0) {
    throw new OutOfRange(`Current ${amps} A through a string is below 0 A; give what it delivers.`);
  }
  return string.groups.reduce((sum, group) => sum + groupVolts(group, amps, string.hasBypass), 0);
}

function groupVolts(group: CellGroup, amps: number, hasBypass: boolean): number {
  const voltsAt = (diodeV: number): number => diodeV - cellAmps(group, diodeV) * group.seriesOhms;
  const carried = (diodeV: number): number => {
    const bypassA = BYPASS_SATURATION_A * Math.expm1(-voltsAt(diodeV) / BYPASS_SLOPE_V);
    return cellAmps(group, diodeV) + (hasBypass ? bypassA : 0);
  };
  return voltsAt(risingRoot((diodeV) => amps - carried(diodeV), group.slopeV));
}

/**
 * Current of a string at a voltage across it, A. Beyond its open-circuit voltage it is 0: a
 * controller or blocking diode lets nothing flow back.
 *
 * @throws {OutOfRange} when the string has no group or the voltage is below zero.
 */
export function stringAmps(string: PanelString, volts: number): number {
  requireString(string);
  if (!Number.isFinite(volts) || volts < 0) {
    throw new OutOfRange(`Voltage ${volts} V across a string is below 0 V; turn its leads round.`);
  }
  const [only] = string.groups;
  if (string.groups.length === 1 && only && !string.hasBypass) {
    return Math.max(0, ampsAt(only, Math.min(volts, openVolts(only))));
  }
  if (volts >= stringVolts(string, 0)) return 0;
  return Math.max(
    0,
    risingRoot((amps) => volts - stringVolts(string, Math.max(0, amps)), mostAmps(string) + 1),
  );
}

/** Points in which a string's power is looked for before the best one is closed in on. */
const SCAN = 160;
/** Golden section. */
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * The point of most power of a string. A partly shaded string has several peaks; the highest of
 * a scan is taken, and closed in on.
 *
 * @throws {OutOfRange} when the string has no group.
 * @example bestPoint({ groups: [GENERIC_36_CELLS], hasBypass: false }) // 17.8745 V, 5.5865 A
 */
export function bestPoint(string: PanelString): WorkPoint {
  requireString(string);
  const most = mostAmps(string);
  const watts = (amps: number): number => amps * stringVolts(string, amps);
  const heights = Array.from({ length: SCAN + 1 }, (_, at) => watts((most * at) / SCAN));
  const best = heights.indexOf(Math.max(...heights));
  const amps = closeIn(watts, [
    (most * Math.max(0, best - 1)) / SCAN,
    (most * Math.min(SCAN, best + 1)) / SCAN,
  ]);
  return { amps, volts: stringVolts(string, amps) };
}

function closeIn(height: (x: number) => number, [from, to]: [from: number, to: number]): number {
  let [low, high] = [from, to];
  for (let cut = 0; cut < 60; cut += 1) {
    const left = high - GOLDEN * (high - low);
    const right = low + GOLDEN * (high - low);
    if (height(left) < height(right)) low = left;
    else high = right;
  }
  return (low + high) / 2;
}

function mostAmps({ groups }: PanelString): number {
  return Math.max(...groups.map(({ lightA }) => lightA));
}

function requireString({ groups }: PanelString): void {
  if (groups.length === 0)
    throw new OutOfRange('A string of no cells has no voltage; add a panel.');
  groups.forEach(requireGroup);
}
