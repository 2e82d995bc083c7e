import { leadAcid } from '../electrical/battery.ts';
import {
  type ChargeLog,
  type ChargeReading,
  logCharge,
  type Stage,
} from '../electrical/charging.ts';
import { type CurvePlan, type CurveRead } from './compiled.ts';
import { type Values } from './evaluate.ts';
import { type CurveView } from './types.ts';

const SECONDS_PER_HOUR = 3600;
const STEP_S = 60;
/** The tail must have held for this long before a charger goes to float. */
const TAIL_HOLD_H = 5 / 60;
const MOST_SAMPLES = 380;
/** Share of a stage left free at each end of a marked interval, so that its ends give nothing away. */
const INSET = 0.18;
/** A shorter piece cannot be read off a printed curve. */
const SHORTEST_INTERVAL_H = 0.2;

/** Runs the charger of a plan on drawn values. */
export function runCurve(plan: CurvePlan, values: Values): ChargeLog {
  const si = (name: string): number => values.get(name) ?? NaN;
  const hours = (name: string | null, otherwise: number): number =>
    name === null ? otherwise : si(name) / SECONDS_PER_HOUR;
  const { battery, charger, load } = plan;
  return logCharge({
    battery: leadAcid(battery.kind, si(battery.capacity) / SECONDS_PER_HOUR, battery.blocks),
    charge: si(battery.charge),
    charger: {
      limitA: si(charger.limit),
      absorptionV: si(charger.absorption),
      floatV: si(charger.float),
      tailA: si(charger.tail),
      tailHoldH: TAIL_HOLD_H,
      longestAbsorptionH: hours(charger.longestAbsorption, Infinity),
    },
    load: load ? { amps: si(load.amps), fromH: hours(load.from, 0) } : { amps: 0, fromH: 0 },
    hours: plan.hours,
    stepS: STEP_S,
  });
}

/**
 * Reads one figure off a run, SI.
 *
 * @throws {Error} when the stage it belongs to is not on the run.
 */
export function readOff(log: ChargeLog, read: CurveRead, values: Values): number {
  switch (read.kind) {
    case 'bulk ends':
      return onRun(log.bulkEndsH, 'bulk does not end') * SECONDS_PER_HOUR;
    case 'float starts':
      return onRun(log.floatStartsH, 'float does not start') * SECONDS_PER_HOUR;
    case 'absorption lasts': {
      const from = onRun(log.bulkEndsH, 'bulk does not end');
      return (onRun(log.floatStartsH, 'float does not start') - from) * SECONDS_PER_HOUR;
    }
    case 'amps before float': {
      onRun(log.floatStartsH, 'float does not start');
      return log.readings.findLast((reading) => reading.stage === 'absorption')?.amps ?? NaN;
    }
    default: {
      const reading = readingAt(log.readings, (values.get(read.at) ?? NaN) / SECONDS_PER_HOUR);
      if (read.kind === 'volts at') return reading.volts;
      return read.kind === 'amps at' ? reading.amps : reading.batteryAmps;
    }
  }
}

function onRun(hour: number | null, what: string): number {
  if (hour !== null) return hour;
  throw new Error(`On this curve ${what}; lengthen the log or narrow the given values.`);
}

/** Between two readings the log is straight. */
function readingAt(readings: readonly ChargeReading[], hour: number): ChargeReading {
  const after = readings.find((reading) => reading.hour >= hour - 1e-9);
  const before = readings.findLast((reading) => reading.hour <= hour + 1e-9);
  if (!after || !before) throw new Error(`The curve has no reading at ${hour} h; move the time.`);
  if (after.hour <= before.hour) return before;
  const share = (hour - before.hour) / (after.hour - before.hour);
  const between = (a: number, b: number): number => a + (b - a) * share;
  return {
    ...before,
    hour,
    volts: between(before.volts, after.volts),
    amps: between(before.amps, after.amps),
    batteryAmps: between(before.batteryAmps, after.batteryAmps),
  };
}

/** What is printed: at most 400 samples, every jump kept, and the intervals to be named. */
export function drawCurve(plan: CurvePlan, log: ChargeLog, values: Values): CurveView {
  const stride = Math.ceil(log.readings.length / MOST_SAMPLES);
  const kept = log.readings.filter((reading, index) => {
    const next = log.readings[index + 1];
    const last = log.readings[index - 1];
    const isJump = next?.stage !== reading.stage || last?.stage !== reading.stage;
    return isJump || index % stride === 0;
  });
  return {
    hours: kept.map((reading) => round(reading.hour, 4)),
    volts: kept.map((reading) => round(reading.volts, 3)),
    amps: kept.map((reading) => round(reading.amps, 2)),
    intervals: markIntervals(plan, log, values),
  };
}

function round(value: number, decimals: number): number {
  return Number(value.toFixed(decimals));
}

/** A stage marked twice without times is cut in two: one interval in each half. */
function markIntervals(plan: CurvePlan, log: ChargeLog, values: Values): CurveView['intervals'] {
  const hourOf = (name: string | null, otherwise: number): number =>
    name === null ? otherwise : (values.get(name) ?? NaN) / SECONDS_PER_HOUR;
  return plan.intervals.map((interval, index) => {
    const { label, stage, before, after } = interval;
    const [from, to] = spanOf(stage, plan, log);
    const isSame = (one: typeof interval): boolean =>
      one.stage === stage && one.before === before && one.after === after;
    const pieces = plan.intervals.filter(isSame).length;
    const place = plan.intervals.slice(0, index).filter(isSame).length;
    const start = Math.max(from, hourOf(after, from));
    const piece = (Math.min(to, hourOf(before, to)) - start) / pieces;
    if (!(piece >= SHORTEST_INTERVAL_H)) {
      throw new Error(
        `Interval ${label} (${stage}) is too short to read; narrow the given values.`,
      );
    }
    return {
      label,
      fromH: round(start + piece * (place + INSET), 2),
      toH: round(start + piece * (place + 1 - INSET), 2),
    };
  });
}

function spanOf(stage: Stage, plan: CurvePlan, log: ChargeLog): [number, number] {
  const bulkEnds = log.bulkEndsH ?? plan.hours;
  const floatStarts = log.floatStartsH ?? plan.hours;
  if (stage === 'bulk') return [0, bulkEnds];
  return stage === 'absorption' ? [bulkEnds, floatStarts] : [floatStarts, plan.hours];
}
