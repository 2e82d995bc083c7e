import { type ChargeLog } from '../electrical/charging/log-charge.ts';
import { type ChargeReading, readingAt, spellsOf } from '../electrical/charging/readings.ts';
import { type CurvePlan, type CurveRead, type StageWord } from './curve-types.ts';
import { type CurveView } from './types.ts';

type Values = ReadonlyMap<string, number>;

const SECONDS_PER_HOUR = 3600;
const MOST_SAMPLES = 400;
/** Share of a stage left free at each end of a marked interval, so that its ends give nothing away. */
const INSET = 0.18;
/** A shorter piece cannot be read off a printed curve: h, or this share of a short log. */
const SHORTEST_INTERVAL_H = 0.2;
const SHORTEST_SHARE = 0.04;
const SAME_H = 1e-9;

/**
 * Reads one figure off a run, SI.
 *
 * @throws {Error} when what it belongs to is not on the run.
 */
export function readOff(log: ChargeLog, read: CurveRead, values: Values): number {
  if ('at' in read) return readAtTime(log, read, values);
  switch (read.kind) {
    case 'absorption lasts':
      return momentS(log, 'float starts') - momentS(log, 'bulk ends');
    case 'amps before float': {
      const endsH = momentS(log, 'float starts') / SECONDS_PER_HOUR;
      const before = log.readings.find((reading) => reading.hour >= endsH - SAME_H);
      return before?.amps ?? NaN;
    }
    case 'amp-hours in bulk':
      momentS(log, 'bulk ends');
      return log.totals.bulkAh * SECONDS_PER_HOUR;
    case 'highest volts':
      return Math.max(...log.readings.map((reading) => reading.batteryVolts));
    default:
      return momentS(log, read.kind);
  }
}

type Event =
  | 'bulk ends'
  | 'float starts'
  | 'quiet ends'
  | 'protection opens'
  | 'vehicle taken'
  | 'vehicle let go';

function momentS(log: ChargeLog, event: Event): number {
  const hours: Record<Event, number | null> = {
    'bulk ends': log.bulkEndsH,
    'float starts': log.floatStartsH,
    'quiet ends': log.quietEndsH,
    'protection opens': log.protectionOpensH,
    'vehicle taken': log.vehicleTakenH,
    'vehicle let go': log.vehicleLetGoH,
  };
  const hour = hours[event];
  if (hour !== null) return hour * SECONDS_PER_HOUR;
  throw new Error(`"${event}" is not on this curve; lengthen the log or narrow the given values.`);
}

/** Between two readings the log is straight. */
function readAtTime(
  log: ChargeLog,
  read: Extract<CurveRead, { at: string }>,
  values: Values,
): number {
  const hour = (values.get(read.at) ?? NaN) / SECONDS_PER_HOUR;
  const reading = readingAt(log.readings, hour);
  if (!reading) throw new Error(`The curve has no reading at ${hour} h; move the time.`);
  const figures = {
    'amps at': reading.amps,
    'volts at': reading.volts,
    'battery amps at': reading.batteryAmps,
    'battery volts at': reading.batteryVolts,
    'input volts at': reading.inputVolts,
  };
  return figures[read.kind];
}

/** What is printed: at most 400 samples a line, every jump kept, and the intervals to be named. */
export function drawCurve(plan: CurvePlan, log: ChargeLog, values: Values): CurveView {
  const kept = thinned(log.readings);
  const line = (key: 'volts' | 'batteryVolts' | 'inputVolts', decimals = 3): number[] =>
    kept.map((reading) => round(reading[key], decimals));
  const show = plan.show ?? [];
  return {
    hours: kept.map((reading) => round(reading.hour, 4)),
    volts: line('volts'),
    amps: kept.map((reading) => round(reading.amps, 2)),
    ...(show.includes('battery volts') && { batteryVolts: line('batteryVolts') }),
    ...(show.includes('input volts') && { inputVolts: line('inputVolts') }),
    ...(show.includes('battery amps') && {
      batteryAmps: kept.map((reading) => round(reading.batteryAmps, 2)),
    }),
    intervals: markIntervals(plan, log, values),
  };
}

/**
 * @throws {Error} when the jumps alone are too many.
 */
function thinned(readings: readonly ChargeReading[]): ChargeReading[] {
  const isKept = readings.map((reading, index) => {
    const [last, next] = [readings[index - 1], readings[index + 1]];
    const isJump = last?.hour === reading.hour || next?.hour === reading.hour;
    return isJump || last?.stage !== reading.stage || next?.stage !== reading.stage;
  });
  const room = MOST_SAMPLES - isKept.filter(Boolean).length;
  const others = readings.length - (MOST_SAMPLES - room);
  if (room < 0) {
    throw new Error(`The curve jumps too often for ${MOST_SAMPLES} samples; shorten the log.`);
  }
  const stride = Math.max(1, others / Math.max(1, room));
  let seen = 0;
  return readings.filter((_, index) => {
    if (isKept[index]) return true;
    seen += 1;
    return Math.floor(seen / stride) > Math.floor((seen - 1) / stride);
  });
}

/** Free of rounding dust and of a nought with a minus. */
function round(value: number, decimals: number): number {
  return Number(value.toFixed(decimals)) + 0;
}

type Interval = CurvePlan['intervals'][number];

/** A stage marked twice without times is cut in two: one interval in each half. */
function markIntervals(plan: CurvePlan, log: ChargeLog, values: Values): CurveView['intervals'] {
  const shortest = Math.min(SHORTEST_INTERVAL_H, plan.hours * SHORTEST_SHARE);
  return plan.intervals.map((interval, index) => {
    const { label, stage, before, after } = interval;
    const isSame = (one: Interval): boolean =>
      one.stage === stage && one.before === before && one.after === after;
    const pieces = plan.intervals.filter(isSame).length;
    const place = plan.intervals.slice(0, index).filter(isSame).length;
    const [from, to] = longestSpell(interval, log, values);
    const piece = (to - from) / pieces;
    if (!(piece >= shortest)) {
      throw new Error(
        `Interval ${label} (${stage}) is too short to read; narrow the given values.`,
      );
    }
    return {
      label,
      fromH: round(from + piece * (place + INSET), 4),
      toH: round(from + piece * (place + 1 - INSET), 4),
    };
  });
}

const SHOWN_AS: Record<StageWord, ChargeReading['stage']> = {
  bulk: 'bulk',
  absorption: 'absorption',
  float: 'float',
  rest: 'rest',
  off: 'off',
  'cannot tell': 'held back',
};

/** The longest stretch that shows the stage between the two times. */
function longestSpell(
  { stage, before, after }: Interval,
  log: ChargeLog,
  values: Values,
): [number, number] {
  const hourOf = (name: string | null, otherwise: number): number =>
    name === null ? otherwise : (values.get(name) ?? NaN) / SECONDS_PER_HOUR;
  const [from, to] = [hourOf(after, 0), hourOf(before, Infinity)];
  const spells = spellsOf(log.readings)
    .filter((spell) => spell.stage === SHOWN_AS[stage])
    .map(({ fromH, toH }): [number, number] => [Math.max(from, fromH), Math.min(to, toH)])
    .sort((one, other) => other[1] - other[0] - (one[1] - one[0]));
  return spells[0] ?? [0, 0];
}
