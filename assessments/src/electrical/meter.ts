import { within } from './out-of-range.ts';

/** A meter's accuracy as its manual gives it: so much of the reading and so many counts. */
export interface MeterSpec {
  percent: number;
  counts: number;
  /** One count: the last digit on this range, in the unit of the reading. */
  digit: number;
}

/**
 * Most a display may be out by, in the unit of the reading.
 *
 * @throws {OutOfRange} when the specification is not a meter's.
 * @example meterError(12.6, { percent: 0.5, counts: 2, digit: 0.01 }) // 0.083
 */
export function meterError(reading: number, spec: MeterSpec): number {
  within(Math.abs(reading), {
    what: 'Reading',
    unit: '',
    least: 0,
    most: 1e6,
    remedy: 'give what the display shows',
  });
  within(spec.percent, {
    what: 'Share of the reading',
    unit: '%',
    least: 0,
    most: 10,
    remedy: 'read it off the manual',
  });
  within(spec.counts, {
    what: 'Counts',
    unit: '',
    least: 0,
    most: 100,
    remedy: 'read them off the manual',
  });
  within(spec.digit, {
    what: 'Last digit',
    unit: '',
    least: 1e-9,
    most: 1000,
    remedy: 'give the value of one count on the range in use',
  });
  return (spec.percent / 100) * Math.abs(reading) + spec.counts * spec.digit;
}

/**
 * Whether two readings differ by more than their meters' own errors can explain.
 *
 * @throws {OutOfRange} when a specification is not a meter's.
 */
export function isRealDifference(first: number, second: number, spec: MeterSpec): boolean {
  return Math.abs(first - second) > meterError(first, spec) + meterError(second, spec);
}

/**
 * What a meter shows at a point fed through a resistance, V: its own input resistance divides the
 * source. A damp path of a megohm lights no lamp and still reads most of the source: a ghost.
 *
 * @throws {OutOfRange} when a resistance is negative or the meter's input is no meter's.
 * @example readThrough({ sourceV: 12.6, pathOhms: 1e6, meterOhms: 10e6 }) // 11.4545
 */
export function readThrough(point: {
  sourceV: number;
  pathOhms: number;
  meterOhms: number;
}): number {
  within(point.sourceV, {
    what: 'Source',
    unit: 'V',
    least: -1500,
    most: 1500,
    remedy: 'give its voltage with nothing connected',
  });
  within(point.pathOhms, {
    what: 'Path to the point',
    unit: 'Ω',
    least: 0,
    most: 1e12,
    remedy: 'give its resistance',
  });
  within(point.meterOhms, {
    what: 'Meter’s input resistance',
    unit: 'Ω',
    least: 1000,
    most: 1e11,
    remedy: 'read it off the manual; 10 MΩ is usual',
  });
  return (point.sourceV * point.meterOhms) / (point.meterOhms + point.pathOhms);
}
