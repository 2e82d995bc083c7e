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
 * The state after a time on one branch: what the pair goes to moves in a straight line from its
 * value at the start to that at the foreseen end, and the pair follows it exactly (second order in
 * the step, however slow or fast the pair is).
 */
export function advance(
  battery: Battery,
  state: BatteryState,
  { spanS, branchAt }: { spanS: number; branchAt: (state: BatteryState) => Branch },
): BatteryState {
  const first = branchAt(state);
  const start = goalOf(battery, state, first);
  const foreseen = follow(state.pairV, { from: start, to: start, spanS });
  const endCharge = charged(battery, state.charge, { amps: foreseen.amps, spanS });
  const last = { charge: endCharge, pairV: state.pairV };
  const to = goalOf(battery, last, branchAt(last));
  const whole = follow(state.pairV, { from: start, to, spanS });
  return {
    charge: charged(battery, state.charge, { amps: whole.amps, spanS }),
    pairV: whole.pairV,
  };
}

/** Where the pair goes at one charge, how fast, and the battery's current on the way. */
interface Goal {
  settledV: number;
  ratePerS: number;
  branch: Branch;
}

function goalOf(battery: Battery, { charge, pairV }: BatteryState, branch: Branch): Goal {
  const { offsetA, slopeS } = branch;
  const ohms = pairOhms(battery, charge, offsetA - slopeS * pairV > 0);
  const stiffness = 1 + slopeS * ohms;
  return { settledV: (offsetA * ohms) / stiffness, ratePerS: stiffness / battery.relaxS, branch };
}

/** The pair's voltage after a time, and the battery's mean current over it. */
function follow(
  pairV: number,
  { from, to, spanS }: { from: Goal; to: Goal; spanS: number },
): { pairV: number; amps: number } {
  const spans = (spanS * (from.ratePerS + to.ratePerS)) / 2;
  const left = Math.exp(-spans);
  const meanLeft = spans > 1e-6 ? (1 - left) / spans : 1;
  const lagV = spans > 1e-6 ? (to.settledV - from.settledV) / spans : 0;
  const offV = pairV - from.settledV + lagV;
  const meanV = (from.settledV + to.settledV) / 2 - lagV + offV * meanLeft;
  const offsetA = (from.branch.offsetA + to.branch.offsetA) / 2;
  return {
    pairV: to.settledV - lagV + offV * left,
    amps: offsetA - from.branch.slopeS * meanV,
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
