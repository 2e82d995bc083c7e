import { ambientBin, ambientFactorIn } from '../electrical/ambient.ts';
import { engineSpaceFactor, sizeForCurrent } from '../electrical/ampacity.ts';
import { conductorsFactor, groupingFactor } from '../electrical/grouping.ts';
import { jacketBefore, ratingIn } from '../electrical/rating-table.ts';
import {
  AMPS,
  AREA,
  at,
  fixed,
  fromMm2,
  type FunctionEntries,
  KELVIN,
  PURE,
  toCelsius,
  toMm2,
} from './trade-function.ts';

const celsiusAt = (si: readonly number[], index: number): number => toCelsius(at(si, index));
const ZERO_C_IN_K = 273.15;

/** What a cable may carry: the rating table and its factors. */
export const RATING_FUNCTIONS: FunctionEntries = [
  [
    'rating',
    fixed('table rating of', { takes: [AREA, KELVIN], gives: AMPS }, (si, profile) =>
      ratingIn(profile, { areaMm2: toMm2(at(si, 0)), jacketC: celsiusAt(si, 1) }),
    ),
  ],
  [
    'prevJacket',
    fixed('column before', { takes: [KELVIN], gives: KELVIN }, (si, profile) => {
      return jacketBefore(profile, celsiusAt(si, 0)) + ZERO_C_IN_K;
    }),
  ],
  [
    'cableForCurrent',
    fixed(
      'smallest size by the rating table for',
      { takes: [AMPS, KELVIN, PURE], gives: AREA },
      (si, profile) => {
        const job = { amps: at(si, 0), jacketC: celsiusAt(si, 1), factor: at(si, 2) };
        return fromMm2(sizeForCurrent(job, profile));
      },
    ),
  ],
  [
    'ambientFactor',
    fixed('ambient factor for', { takes: [KELVIN, KELVIN], gives: PURE }, (si, profile) =>
      ambientFactorIn(profile, { jacketC: celsiusAt(si, 0), ambientC: celsiusAt(si, 1) }),
    ),
  ],
  [
    'ambientBin',
    fixed('printed ambient factor for', { takes: [KELVIN, KELVIN], gives: PURE }, (si) =>
      ambientBin(celsiusAt(si, 0), celsiusAt(si, 1)),
    ),
  ],
  [
    'groupingFactor',
    fixed('grouping factor for', { takes: [PURE], gives: PURE }, (si) => groupingFactor(at(si, 0))),
  ],
  [
    'conductorsFactor',
    fixed('factor for loaded conductors,', { takes: [PURE], gives: PURE }, (si) =>
      conductorsFactor(at(si, 0)),
    ),
  ],
  [
    'engineFactor',
    fixed('engine-space factor for', { takes: [KELVIN], gives: PURE }, (si, profile) =>
      engineSpaceFactor(celsiusAt(si, 0), profile),
    ),
  ],
];
