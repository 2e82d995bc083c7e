import { type Battery, batteryModel, cellsIn } from '../electrical/charging/battery-model.ts';
import { type ChargeLog, logCharge } from '../electrical/charging/log-charge.ts';
import {
  type ChargerSettings,
  type ChargeRun,
  type SolarInput,
  type VehicleInput,
} from '../electrical/charging/settings.ts';
import { type CurvePlan } from './curve-types.ts';

/** Values by name, SI. */
type Values = ReadonlyMap<string, number>;

const SECONDS_PER_HOUR = 3600;
const ZERO_C_IN_K = 273.15;
const REFERENCE_C = 25;
const LONGEST_STEP_S = 60;
/** A short log is still resolved into so many steps. */
const LEAST_STEPS = 720;
/** The tail must have held for this long before a charger goes to float. */
const TAIL_HOLD_H = 5 / 60;
/** How long a hot charger's limit slides where the sheet does not say. */
const SLIDE_H = 0.5;

/** More runs than this are not kept: each is some hundred kilobytes. */
const MOST_KEPT = 1000;
const keptRuns = new WeakMap<CurvePlan, Map<string, ChargeLog>>();

/**
 * Keeps every run of a plan until told to forget them: drawn ten thousand times, a curve meets the
 * same settings over and over.
 */
export function keepRuns(plan: CurvePlan): { forget: () => void } {
  keptRuns.set(plan, new Map());
  return { forget: () => keptRuns.delete(plan) };
}

/** Runs the charger of a plan on drawn values. */
export function runCurve(plan: CurvePlan, values: Values): ChargeLog {
  const run = runOf(plan, values);
  const kept = keptRuns.get(plan);
  if (!kept) return logCharge(run);
  const settings = JSON.stringify(run);
  const log = kept.get(settings) ?? logCharge(run);
  if (kept.size < MOST_KEPT) kept.set(settings, log);
  return log;
}

function runOf(plan: CurvePlan, values: Values): ChargeRun {
  const read = readerOf(values);
  const { load, vehicle, solar, hours } = plan;
  return {
    battery: batteryOf(plan, read),
    charge: read.si(plan.battery.charge),
    charger: chargerOf(plan, read),
    load: {
      amps: load ? read.si(load.amps) : 0,
      fromH: read.hours(load?.from, 0),
      untilH: read.hours(load?.until, Infinity),
    },
    ...(vehicle && { vehicle: vehicleOf(vehicle, read) }),
    ...(solar && { solar: solarOf(solar, read) }),
    hours,
    stepS: Math.max(1, Math.min(LONGEST_STEP_S, (hours * SECONDS_PER_HOUR) / LEAST_STEPS)),
  };
}

interface Reader {
  si(name: string): number;
  /** Of a name that may be missing. */
  or(name: string | undefined, otherwise: number): number;
  hours(name: string | null | undefined, otherwise: number): number;
}

function readerOf(values: Values): Reader {
  const si = (name: string): number => values.get(name) ?? NaN;
  return {
    si,
    or: (name, otherwise) => (name === undefined ? otherwise : si(name)),
    hours: (name, otherwise) =>
      name === null || name === undefined ? otherwise : si(name) / SECONDS_PER_HOUR,
  };
}

function celsiusOf({ battery }: CurvePlan, read: Reader): number {
  return read.or(battery.temperature, REFERENCE_C + ZERO_C_IN_K) - ZERO_C_IN_K;
}

function batteryOf(plan: CurvePlan, read: Reader): Battery {
  const { kind, capacity, blocks, aged, protection } = plan.battery;
  const model = batteryModel({
    kind,
    blocks,
    capacityAh: read.si(capacity) / SECONDS_PER_HOUR,
    celsius: Number(celsiusOf(plan, read).toFixed(9)),
    ...(aged && {
      aged: { capacity: read.si(aged.capacity), resistance: read.si(aged.resistance) },
    }),
  });
  if (!protection) return model;
  const opensV = read.si(protection.opensAt);
  return { ...model, protection: { opensV, closesV: read.or(protection.closesAt, -Infinity) } };
}

function chargerOf(plan: CurvePlan, read: Reader): ChargerSettings {
  const { charger, battery } = plan;
  const perCell = read.or(charger.compensation, 0);
  return {
    limitA: read.si(charger.limit),
    absorptionV: read.si(charger.absorption),
    floatV: charger.float === null ? NaN : read.si(charger.float),
    tailA: read.si(charger.tail),
    tailHoldH: TAIL_HOLD_H,
    tailAt: charger.tailAt ?? 'charger',
    leastAbsorptionH: read.hours(charger.leastAbsorption, 0),
    longestAbsorptionH: read.hours(charger.longestAbsorption, Infinity),
    afterAbsorption: charger.afterAbsorption ?? 'float',
    restartV: read.or(charger.restart, -Infinity),
    compensationV:
      perCell * cellsIn(battery.kind, battery.blocks) * (celsiusOf(plan, read) - REFERENCE_C),
    quietUntilH: read.hours(charger.quietUntil, 0),
    leadOhms: read.or(charger.lead, 0),
    sense: charger.sense ?? 'charger',
    ...held(charger, read),
  };
}

function held(
  { derate, pauses }: CurvePlan['charger'],
  read: Reader,
): Pick<ChargerSettings, 'derate' | 'pauses'> {
  return {
    ...(derate && {
      derate: {
        fromH: read.hours(derate.from, 0),
        toA: read.si(derate.to),
        overH: read.hours(derate.over, SLIDE_H),
      },
    }),
    ...(pauses && {
      pauses: { everyH: read.hours(pauses.every, 0), forH: read.hours(pauses.for, 0) },
    }),
  };
}

function vehicleOf(plan: NonNullable<CurvePlan['vehicle']>, read: Reader): VehicleInput {
  return {
    fromH: read.hours(plan.from, 0),
    untilH: read.hours(plan.until, Infinity),
    volts: read.si(plan.volts),
    engageV: read.si(plan.engage),
    releaseV: read.si(plan.release),
    delayH: read.hours(plan.delay, 0),
    hasOverride: plan.override,
    cableOhms: read.si(plan.cable),
    efficiency: read.si(plan.efficiency),
    battery: batteryModel({
      kind: 'flooded',
      blocks: 1,
      capacityAh: read.si(plan.battery.capacity) / SECONDS_PER_HOUR,
    }),
    charge: read.si(plan.battery.charge),
  };
}

function solarOf({ amps, shade }: NonNullable<CurvePlan['solar']>, read: Reader): SolarInput {
  if (!shade) return { amps: read.si(amps) };
  return {
    amps: read.si(amps),
    shade: {
      fromH: read.hours(shade.from, 0),
      untilH: read.hours(shade.until, 0),
      amps: read.si(shade.amps),
    },
  };
}
