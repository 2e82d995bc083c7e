/** A quantity outside what a rule of the trade covers; the message names value, rule and remedy. */
export class OutOfRange extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'OutOfRange';
  }
}

interface Bounds {
  what: string;
  unit: string;
  least: number;
  most: number;
  remedy: string;
}

/**
 * Passes a value that lies within its bounds, both ends included.
 *
 * @throws {OutOfRange} when the value is not a finite number within the bounds.
 */
export function within(value: number, bounds: Bounds): number {
  if (Number.isFinite(value) && value >= bounds.least && value <= bounds.most) return value;
  const { what, unit, least, most, remedy } = bounds;
  const reach = most === Infinity ? `at least ${least} ${unit}` : `${least} to ${most} ${unit}`;
  throw new OutOfRange(`${what} ${value} ${unit} is outside ${reach}; ${remedy}.`);
}
