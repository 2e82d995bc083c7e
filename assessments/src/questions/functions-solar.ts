import { coldFactor } from '../electrical/cold-voltage.ts';
import { at, fixed, type FunctionEntries, KELVIN, PURE, toCelsius } from './trade-function.ts';

/** Panels. */
export const SOLAR_FUNCTIONS: FunctionEntries = [
  [
    'coldFactor',
    fixed('table factor for', { takes: [KELVIN], gives: PURE }, (si) =>
      coldFactor(toCelsius(at(si, 0))),
    ),
  ],
];
