import { type Battery, chargingOhms, openCircuitV } from './battery.ts';
import { OutOfRange, within } from './out-of-range.ts';

export type Stage = 'bulk' | 'absorption' | 'float';

/** What a staged charger is set to. Voltages are at its own posts, which are the battery's here. */
export interface ChargerSettings {
  limitA: number;
  absorptionV: number;
  floatV: number;
  /** Absorption ends when the charger's current has been under this for the hold time. */
  tailA: number;
  tailHoldH: number;
  /** Absorption ends at this time whatever the current, h; Infinity for no limit. */
  longestAbsorptionH: number;
}

/** A steady load on the bank, from one time on. */
export interface SteadyLoad {
  amps: number;
  fromH: number;
}

export interface ChargeRun {
  battery: Battery;
  /** Share charged at the start, 0 to 1. */
  charge: number;
  charger: ChargerSettings;
  load: SteadyLoad;
  hours: number;
  stepS: number;
}

export interface ChargeReading {
  hour: number;
  volts: number;
  /** Out of the charger; the battery takes this less the load. */
  amps: number;
  batteryAmps: number;
  charge: number;
  stage: Stage;
}

export interface ChargeLog {
  readings: ChargeReading[];
  bulkEndsH: number | null;
  floatStartsH: number | null;
}

interface State {
  hour: number;
  charge: number;
  stage: Stage;
  absorptionFromH: number;
  underTailFromH: number | null;
}

/**
 * Runs a staged charger against a battery: bulk at the current limit, absorption at a held
 * voltage, float at a lower one. Deterministic; second order in the step, with the moment a
 * limit is crossed found inside the step.
 *
 * The model is illustrative and fitted to no battery (from memory).
 *
 * @throws {OutOfRange} when a setting makes no sense or the current limit cannot carry the load.
 */
export function logCharge(run: ChargeRun): ChargeLog {
  requireSettings(run);
  const stepH = run.stepS / 3600;
  const log: ChargeLog = { readings: [], bulkEndsH: null, floatStartsH: null };
  let state: State = {
    hour: 0,
    charge: run.charge,
    stage: 'bulk',
    absorptionFromH: 0,
    underTailFromH: null,
  };
  log.readings.push(readingOf(run, state));
  while (state.hour < run.hours - 1e-9) {
    const edge = run.load.fromH > state.hour + 1e-9 ? run.load.fromH : Infinity;
    const spanH = Math.min(stepH, run.hours - state.hour, edge - state.hour);
    state = advance(run, state, spanH);
    record(run, state, log);
  }
  return log;
}

/** Appends a reading and, where a stage has just ended, its time and the reading after it. */
function record(run: ChargeRun, state: State, log: ChargeLog): void {
  const reading = readingOf(run, state);
  log.readings.push(reading);
  if (state.stage === 'bulk' && chargerAmps(run, state) < run.charger.limitA * (1 - 1e-9)) {
    state.stage = 'absorption';
    state.absorptionFromH = state.hour;
    log.bulkEndsH = state.hour;
  } else if (state.stage === 'absorption' && absorptionIsOver(run, state, reading.amps)) {
    state.stage = 'float';
    log.floatStartsH = state.hour;
    log.readings.push(readingOf(run, state));
  }
}

function absorptionIsOver(run: ChargeRun, state: State, amps: number): boolean {
  const { tailA, tailHoldH, longestAbsorptionH } = run.charger;
  if (amps >= tailA) state.underTailFromH = null;
  else state.underTailFromH ??= state.hour;
  const heldH = state.underTailFromH === null ? -1 : state.hour - state.underTailFromH;
  return (
    heldH >= tailHoldH - 1e-9 || state.hour - state.absorptionFromH >= longestAbsorptionH - 1e-9
  );
}

/** One step, cut short where bulk reaches its voltage, the tail is crossed or a time runs out. */
function advance(run: ChargeRun, state: State, spanH: number): State {
  const wholeH = Math.min(spanH, untilTimedEvent(run, state));
  const whole = move(run, state, wholeH);
  const crossed = (end: State): boolean =>
    state.stage === 'bulk'
      ? chargerAmps(run, end) < run.charger.limitA * (1 - 1e-9)
      : state.stage === 'absorption' &&
        state.underTailFromH === null &&
        chargerAmps(run, end) < run.charger.tailA;
  if (!crossed(whole)) return whole;
  let before = 0;
  let after = wholeH;
  for (let cut = 0; cut < 40; cut += 1) {
    const middle = (before + after) / 2;
    if (crossed(move(run, state, middle))) after = middle;
    else before = middle;
  }
  return move(run, state, after);
}

function untilTimedEvent(run: ChargeRun, state: State): number {
  if (state.stage !== 'absorption') return Infinity;
  const timeOut = state.absorptionFromH + run.charger.longestAbsorptionH - state.hour;
  const held =
    state.underTailFromH === null
      ? Infinity
      : state.underTailFromH + run.charger.tailHoldH - state.hour;
  return Math.max(1e-9, Math.min(timeOut, held));
}

/** Midpoint rule: the slope half-way through the step carries the whole of it. */
function move(run: ChargeRun, state: State, spanH: number): State {
  const halfway = state.charge + (slopePerH(run, state) * spanH) / 2;
  const middle = { ...state, hour: state.hour, charge: clampShare(halfway) };
  const charge = clampShare(state.charge + slopePerH(run, middle) * spanH);
  return { ...state, hour: state.hour + spanH, charge };
}

function slopePerH(run: ChargeRun, state: State): number {
  const amps = chargerAmps(run, state) - loadAmps(run, state);
  const kept = amps > 0 ? amps * run.battery.efficiency : amps;
  return kept / run.battery.capacityAh;
}

function chargerAmps(run: ChargeRun, state: State): number {
  const holdV = state.stage === 'float' ? run.charger.floatV : run.charger.absorptionV;
  const taken =
    (holdV - openCircuitV(run.battery, state.charge)) / chargingOhms(run.battery, state.charge);
  const wanted = taken + loadAmps(run, state);
  return Math.max(0, Math.min(run.charger.limitA, wanted));
}

function loadAmps(run: ChargeRun, state: State): number {
  return state.hour >= run.load.fromH - 1e-9 ? run.load.amps : 0;
}

function readingOf(run: ChargeRun, state: State): ChargeReading {
  const amps = chargerAmps(run, state);
  const batteryAmps = amps - loadAmps(run, state);
  const volts =
    openCircuitV(run.battery, state.charge) + batteryAmps * chargingOhms(run.battery, state.charge);
  return { hour: state.hour, volts, amps, batteryAmps, charge: state.charge, stage: state.stage };
}

function clampShare(charge: number): number {
  return Math.min(1, Math.max(0, charge));
}

function requireSettings(run: ChargeRun): void {
  const { charger, load } = run;
  within(run.charge, {
    what: 'Charge at the start',
    unit: 'of full',
    least: 0,
    most: 0.99,
    remedy: 'give it as a share of the capacity',
  });
  within(run.hours, { what: 'Log', unit: 'h', least: 0.1, most: 48, remedy: 'shorten it' });
  within(run.stepS, {
    what: 'Step',
    unit: 's',
    least: 1,
    most: 600,
    remedy: 'choose a shorter one',
  });
  if (charger.floatV >= charger.absorptionV) {
    throw new OutOfRange(
      `Float ${charger.floatV} V is not below absorption ${charger.absorptionV} V; lower the float setting.`,
    );
  }
  if (charger.limitA <= load.amps) {
    throw new OutOfRange(
      `A ${charger.limitA} A charger cannot charge behind a ${load.amps} A load; lower the load.`,
    );
  }
}
