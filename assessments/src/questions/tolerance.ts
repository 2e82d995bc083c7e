import { type QuantityPart, type Rounding } from './compiled.ts';
import { fromSi, toSi, type Unit } from './units.ts';

/** Edges count as inside, so the last binary digit may not push a value over one. */
const EDGE = 1e-9;

export interface Range {
  low: number;
  high: number;
}

/** The key of a part, rounded where the part says how. */
export function keyOf(part: QuantityPart, stepUnit: Unit, si: number): number {
  const unit = part.units[0] ?? stepUnit;
  return part.rounding ? toSi(roundTo(fromSi(si, unit), part.rounding), unit) : si;
}

function roundTo(figure: number, { to, way }: NonNullable<Rounding>): number {
  const count = figure / to;
  const slack = EDGE * Math.max(1, Math.abs(count));
  if (way === 'up') return Math.ceil(count - slack) * to;
  if (way === 'down') return Math.floor(count + slack) * to;
  return Math.round(count) * to;
}

/** What counts as the key: both edges included. */
export function rangeOf(part: QuantityPart, key: number): Range {
  const width =
    part.tolerance.kind === 'plain' ? part.tolerance.si : Math.abs(key) * part.tolerance.share;
  return { low: key - width, high: key + width };
}

export function isWithin(value: number, { low, high }: Range): boolean {
  const slack = EDGE * Math.max(Math.abs(low), Math.abs(high));
  return value >= low - slack && value <= high + slack;
}

/** Whether two values could be taken for each other: within two tolerances. */
export function isTooNear(part: QuantityPart, key: number, value: number): boolean {
  const { low, high } = rangeOf(part, key);
  return isWithin(value, { low: key - 2 * (key - low), high: key + 2 * (high - key) });
}

/** Half a tolerance either side: a predicted wrong value is recognised more strictly than a right one. */
export function slipRangeOf(part: QuantityPart, value: number): Range {
  const { low, high } = rangeOf(part, value);
  const least = Math.abs(value) * 0.0051;
  const half = Math.max((high - low) / 4, Math.min(least, (high - low) / 2));
  return { low: value - half, high: value + half };
}
