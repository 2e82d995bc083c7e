import { restV } from './battery-model.ts';
import {
  type BatteryState,
  type Branch,
  branchNow,
  type CircuitReading,
  type Drive,
  readCircuit,
} from './circuit.ts';
import { type InputReading, readInput, type SourceChooser } from './inputs.ts';
import { type ChargeRun } from './settings.ts';
import { type StageKeeper } from './stage-keeper.ts';
import { isPaused, loadAt, ownLimitAt, SAME_H, sunAmpsAt } from './timetable.ts';

/** What flows on its own. */
export interface Moment {
  hour: number;
  battery: BatteryState;
  /** Of the start battery; NaN without one. */
  startCharge: number;
}

/** A run with what its switches stand at; they change only between two steps. */
export interface World {
  run: ChargeRun;
  sources: SourceChooser;
  keeper: StageKeeper;
  /** The battery's own protection keeps charge out. */
  isShut: boolean;
  /** The moment it opened; null while it is closed. */
  shutFromH: number | null;
}

/** Once open, the protection stays so for this long whatever the cells do, h. */
const SHUT_HOLD_H = 1 / 60;

/** The moment from which an open protection may close; Infinity while there is none to wait for. */
export function mayCloseAtH({ shutFromH }: World): number {
  return shutFromH === null ? Infinity : shutFromH + SHUT_HOLD_H;
}

/** All that can be read at a moment. */
export interface Sight {
  drive: Drive;
  branch: Branch;
  circuit: CircuitReading;
  input: InputReading | null;
}

/** Whether the charger has a source and does not stop to look at it. */
export function isWorking({ run, sources }: World, hour: number): boolean {
  return sources.source !== 'none' && !isPaused(run.charger, hour);
}

/** What the charger does at a time, its switches standing as they do. */
export function driveAt(world: World, hour: number): Drive {
  const { run, sources, keeper, isShut } = world;
  const { charger } = run;
  const ownA = ownLimitAt(charger, hour);
  return {
    holdV: isWorking(world, hour) ? keeper.holdV : null,
    limitA: sources.source === 'solar' ? Math.min(ownA, sunAmpsAt(run, hour)) : ownA,
    loadA: loadAt(run, hour),
    leadOhms: charger.leadOhms ?? 0,
    sense: charger.sense ?? 'charger',
    isShut,
  };
}

/** Reads a moment by the timetable of an hour: its own, or the instant before it. */
export function look(world: World, moment: Moment, hour: number): Sight {
  const { run, sources } = world;
  const drive = driveAt(world, hour);
  const branch = branchNow(run.battery, moment.battery, drive);
  const circuit = readCircuit(run.battery, moment.battery, { drive, branch });
  const { vehicle } = run;
  if (!vehicle) return { drive, branch, circuit, input: null };
  const drawn = sources.source === 'vehicle' ? circuit.volts * circuit.amps : 0;
  const watts = drawn / vehicle.efficiency;
  return {
    drive,
    branch,
    circuit,
    input: readInput(vehicle, { hour, charge: moment.startCharge, watts }),
  };
}

/** Whether the battery's protection would change over. */
export function isTripping(world: World, { battery, hour }: Moment, sight: Sight): boolean {
  const { run, isShut } = world;
  const { protection, refusesCharge } = run.battery;
  if (!protection || refusesCharge) return false;
  const { batteryAmps, batteryVolts } = sight.circuit;
  if (!isShut) return batteryAmps > 0 && batteryVolts >= protection.opensV;
  if (hour < mayCloseAtH(world) - SAME_H) return false;
  return restV(run.battery, battery.charge) + battery.pairV <= protection.closesV;
}

const BRANCHES = { limit: 0, voltage: 1, idle: 2 };

/** Everything that is either so or not, as bits; a step ends where one of them changes. */
export function flagsOf(world: World, moment: Moment, sight: Sight): number {
  const { keeper, sources } = world;
  const { circuit, branch, input } = sight;
  let flags = BRANCHES[branch.at];
  if (branch.at === 'voltage' && circuit.batteryAmps > 0) flags += 4;
  if (keeper.isUnderTail(circuit)) flags += 8;
  if (keeper.isUnderRestart(circuit)) flags += 16;
  if (keeper.isFallenBack(circuit)) flags += 32;
  if (isTripping(world, moment, sight)) flags += 64;
  if (input !== null && sources.isCalling(input)) flags += 128;
  return flags;
}
