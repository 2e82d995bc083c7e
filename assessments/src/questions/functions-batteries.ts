import { chargeOfGravity, freezingPointC, gravityShift } from '../electrical/hydrometer.ts';
import { at, fixed, type FunctionEntries, KELVIN, PURE, toCelsius } from './trade-function.ts';

const ZERO_C_IN_K = 273.15;

/** The hydrometer and what it says. */
export const BATTERY_FUNCTIONS: FunctionEntries = [
  [
    'gravityShift',
    fixed('hydrometer correction at', { takes: [KELVIN], gives: PURE }, (si) =>
      gravityShift(toCelsius(at(si, 0))),
    ),
  ],
  [
    'chargeOfGravity',
    fixed('charge by the table at', { takes: [PURE], gives: PURE }, (si) =>
      chargeOfGravity(at(si, 0)),
    ),
  ],
  [
    'freezingPoint',
    fixed(
      'freezing point by the table at',
      { takes: [PURE], gives: KELVIN },
      (si) => freezingPointC(at(si, 0)) + ZERO_C_IN_K,
    ),
  ],
];
