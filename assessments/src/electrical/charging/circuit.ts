import { type Battery, pairOhms, restV } from './battery-model.ts';

/** A battery at one moment. */
export interface BatteryState {
  charge: number;
  /** Across the relaxation pair, V. */
  pairV: number;
}

/** What the charger does, and what hangs on the bank, at one moment. */
export interface Drive {
  /** Held where it senses; null gives no output at all. */
  holdV: number | null;
  limitA: number;
  loadA: number;
  leadOhms: number;
  sense: 'charger' | 'battery';
  /** The battery's own protection keeps charge out. */
  isShut: boolean;
}

/**
 * How the battery's current follows the pair's voltage: amps = offsetA − slopeS × pairV. A steady
 * current has no slope. `at` says what decides: the charger's limit, its voltage, or nothing, when
 * the battery stands above what it holds.
 */
export interface Branch {
  at: 'limit' | 'voltage' | 'idle';
  offsetA: number;
  slopeS: number;
}

export interface CircuitReading {
  volts: number;
  batteryVolts: number;
  amps: number;
  batteryAmps: number;
  at: Branch['at'];
}

/** Which of its three ways the circuit is in. */
export function branchNow(battery: Battery, state: BatteryState, drive: Drive): Branch {
  const { holdV, isShut, limitA, loadA } = drive;
  if (holdV === null) return branchOn('idle', { battery, state, drive });
  // Shut to charge, the battery still feeds loads when it stands above what is held.
  const isAbove = isShut && restV(battery, state.charge) + state.pairV >= holdV;
  if (isAbove) return branchOn('idle', { battery, state, drive });
  const held = branchOn('voltage', { battery, state, drive });
  const heldA = held.offsetA - held.slopeS * state.pairV + loadA;
  if (heldA > 0 && heldA < limitA) return held;
  return branchOn(heldA > 0 ? 'limit' : 'idle', { battery, state, drive });
}

/** The same way at another charge. */
export function branchOn(
  at: Branch['at'],
  { battery, state, drive }: { battery: Battery; state: BatteryState; drive: Drive },
): Branch {
  const { holdV, loadA, limitA, leadOhms, sense, isShut } = drive;
  if (at === 'idle') return { at, offsetA: -loadA, slopeS: 0 };
  if (at === 'limit') return { at, offsetA: limitA - loadA, slopeS: 0 };
  // With the battery shut out the charger carries the loads alone.
  if (isShut) return { at, offsetA: 0, slopeS: 0 };
  const slopeS = 1 / (battery.seriesOhms + (sense === 'charger' ? leadOhms : 0));
  const aboveRestV = (holdV ?? 0) - restV(battery, state.charge) + loadA * battery.seriesOhms;
  return { at, offsetA: aboveRestV * slopeS - loadA, slopeS };
}

/** Volts and amps of the whole circuit on a branch. */
export function readCircuit(
  battery: Battery,
  state: BatteryState,
  { drive, branch }: { drive: Drive; branch: Branch },
): CircuitReading {
  const { loadA, leadOhms, holdV, sense } = drive;
  const batteryAmps = branch.offsetA - branch.slopeS * state.pairV;
  const amps = branch.at === 'idle' ? 0 : Math.max(0, batteryAmps + loadA);
  const cellV = restV(battery, state.charge) + state.pairV + batteryAmps * battery.seriesOhms;
  const isHeldApart = drive.isShut && branch.at === 'voltage' && holdV !== null;
  const heldV = (holdV ?? 0) - (sense === 'charger' ? amps * leadOhms : 0);
  const batteryVolts = isHeldApart ? heldV : cellV;
  return { volts: batteryVolts + amps * leadOhms, batteryVolts, amps, batteryAmps, at: branch.at };
}

/**
 * The state after a time on one branch: the pair exactly, the charge by its slope half-way through
 * (second order in the step).
 */
export function advance(
  battery: Battery,
  state: BatteryState,
  { spanS, branchAt }: { spanS: number; branchAt: (state: BatteryState) => Branch },
): BatteryState {
  const first = meanOver(battery, state, { spanS: spanS / 2, branch: branchAt(state) });
  const middle = charged(battery, state.charge, { amps: first.amps, spanS: spanS / 2 });
  const atMiddle = { charge: middle, pairV: state.pairV };
  const whole = meanOver(battery, atMiddle, { spanS, branch: branchAt(atMiddle) });
  return {
    charge: charged(battery, state.charge, { amps: whole.amps, spanS }),
    pairV: whole.pairV,
  };
}

const SECONDS_PER_HOUR = 3600;

function charged(
  battery: Battery,
  charge: number,
  { amps, spanS }: { amps: number; spanS: number },
): number {
  const stays = amps > 0 ? amps * battery.efficiency : amps;
  const share = charge + (stays * spanS) / SECONDS_PER_HOUR / battery.capacityAh;
  return Math.min(1, Math.max(0, share));
}

/** The pair's voltage after a time at one charge, and the battery's mean current over it. */
function meanOver(
  battery: Battery,
  { charge, pairV }: BatteryState,
  { spanS, branch }: { spanS: number; branch: Branch },
): { pairV: number; amps: number } {
  const { offsetA, slopeS } = branch;
  const ohms = pairOhms(battery, charge, offsetA - slopeS * pairV > 0);
  const settledV = (offsetA * ohms) / (1 + slopeS * ohms);
  const spans = (spanS * (1 + slopeS * ohms)) / battery.relaxS;
  const left = Math.exp(-spans);
  const meanShare = spans > 1e-9 ? (1 - left) / spans : 1;
  const meanV = settledV + (pairV - settledV) * meanShare;
  return { pairV: settledV + (pairV - settledV) * left, amps: offsetA - slopeS * meanV };
}
