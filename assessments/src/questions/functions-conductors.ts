import {
  ambientFactor,
  engineSpaceFactor,
  groupingFactor,
  ratingAmps,
  sizeForCurrent,
} from '../electrical/ampacity.ts';
import { classFiveOhmsPerKm } from '../electrical/conductors.ts';
import { CABLE_AREAS_MM2, FUSE_RATINGS_A, nextSize } from '../electrical/stock.ts';
import { sizeForDrop } from '../electrical/voltage-drop.ts';
import {
  AMPS,
  AREA,
  at,
  fixed,
  fromMm2,
  type FunctionEntries,
  KELVIN,
  METRES,
  OHMS_PER_METRE,
  PURE,
  toCelsius,
  toMm2,
  VOLTS,
} from './trade-function.ts';

/** Cable, its rating and its fuse. */
export const CONDUCTOR_FUNCTIONS: FunctionEntries = [
  [
    'tableOhms',
    fixed('table resistance of', { takes: [AREA], gives: OHMS_PER_METRE }, (si) => {
      return classFiveOhmsPerKm(toMm2(at(si, 0))) / 1000;
    }),
  ],
  [
    'nextCable',
    fixed('next stock size from', { takes: [AREA], gives: AREA }, (si) =>
      fromMm2(nextSize(toMm2(at(si, 0)), CABLE_AREAS_MM2)),
    ),
  ],
  [
    'nextFuse',
    fixed('next fuse from', { takes: [AMPS], gives: AMPS }, (si) =>
      nextSize(at(si, 0), FUSE_RATINGS_A),
    ),
  ],
  [
    'cableForDrop',
    fixed(
      'smallest size by the cable table for',
      { takes: [AMPS, METRES, VOLTS], gives: AREA },
      (si) => fromMm2(sizeForDrop({ amps: at(si, 0), lengthM: at(si, 1), limitV: at(si, 2) })),
    ),
  ],
  [
    'rating',
    fixed('table rating of', { takes: [AREA, KELVIN], gives: AMPS }, (si) =>
      ratingAmps(toMm2(at(si, 0)), toCelsius(at(si, 1))),
    ),
  ],
  [
    'cableForCurrent',
    fixed(
      'smallest size by the rating table for',
      { takes: [AMPS, KELVIN, PURE], gives: AREA },
      (si) =>
        fromMm2(
          sizeForCurrent({ amps: at(si, 0), jacketC: toCelsius(at(si, 1)), factor: at(si, 2) }),
        ),
    ),
  ],
  [
    'ambientFactor',
    fixed('ambient factor for', { takes: [KELVIN, KELVIN], gives: PURE }, (si) =>
      ambientFactor(toCelsius(at(si, 0)), toCelsius(at(si, 1))),
    ),
  ],
  [
    'groupingFactor',
    fixed('grouping factor for', { takes: [PURE], gives: PURE }, (si) => groupingFactor(at(si, 0))),
  ],
  [
    'engineFactor',
    fixed('engine-space factor for', { takes: [KELVIN], gives: PURE }, (si) =>
      engineSpaceFactor(toCelsius(at(si, 0))),
    ),
  ],
];
