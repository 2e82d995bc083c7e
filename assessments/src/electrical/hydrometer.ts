import { within } from './out-of-range.ts';

const SHIFT_PER_KELVIN = 0.001 / (3 / 1.8);
const REFERENCE_C = 25;

/**
 * What a hydrometer reading is corrected by: +0.001 for each 3 °F over 77 °F, so that cold acid,
 * which reads high, loses something (US Bureau of Reclamation FIST 3-6, second-hand copy).
 *
 * @param celsius - electrolyte, -30 to 60 °C.
 * @throws {OutOfRange} when it lies outside.
 */
export function gravityShift(celsius: number): number {
  within(celsius, {
    what: 'Electrolyte temperature',
    unit: '°C',
    least: -30,
    most: 60,
    remedy: 'read the thermometer of the hydrometer',
  });
  return (celsius - REFERENCE_C) * SHIFT_PER_KELVIN;
}

/** Specific gravity at full and at the row the table calls almost discharged. */
const FULL_GRAVITY = 1.28;
const EMPTY_GRAVITY = 1.16;
/** The table's row "discharged": nothing is left to use. */
const LEAST_GRAVITY = 1.13;

/**
 * Share of charge by specific gravity at 80 °F: 1.280 full, each 0.030 less a quarter less, nothing
 * at 1.160 and below (US Army TM 5-1185 table II; straight lines between its rows).
 *
 * @param gravity - corrected, 1.130 to 1.300.
 * @throws {OutOfRange} when it lies outside.
 */
export function chargeOfGravity(gravity: number): number {
  within(gravity, {
    what: 'Specific gravity',
    unit: '',
    least: LEAST_GRAVITY,
    most: 1.3,
    remedy: 'read the cell again and correct it for temperature',
  });
  const share = (gravity - EMPTY_GRAVITY) / (FULL_GRAVITY - EMPTY_GRAVITY);
  return Math.min(1, Math.max(0, share));
}

/** Specific gravity and the °F at which the electrolyte freezes (US Army TM 5-1185 table III). */
const FREEZES: readonly (readonly [gravity: number, fahrenheit: number])[] = [
  [1.1, 19],
  [1.15, 5],
  [1.2, -16],
  [1.25, -62],
  [1.28, -90],
];

/**
 * Temperature at which an electrolyte freezes, °C; straight lines between the rows of the table.
 *
 * @param gravity - 1.100 to 1.280.
 * @throws {OutOfRange} when it lies outside.
 */
export function freezingPointC(gravity: number): number {
  within(gravity, {
    what: 'Specific gravity',
    unit: '',
    least: 1.1,
    most: 1.28,
    remedy: 'the printed table ends there',
  });
  const upper = FREEZES.findIndex(([row]) => row >= gravity);
  const [high, highF] = FREEZES[Math.max(upper, 1)] ?? [NaN, NaN];
  const [low, lowF] = FREEZES[Math.max(upper, 1) - 1] ?? [NaN, NaN];
  const fahrenheit = lowF + ((highF - lowF) * (gravity - low)) / (high - low);
  return (fahrenheit - 32) / 1.8;
}
