import { classFiveOhmsPerKm, resistanceAt } from '../electrical/conductors.ts';
import { gaugeOhmsPerKm } from '../electrical/gauge-resistance.ts';
import { gaugeAreaMm2, gaugeDiameterMm } from '../electrical/gauge.ts';
import { iecOhmsPerKm } from '../electrical/iec-resistance.ts';
import { nextGauge, stockAreasMm2 } from '../electrical/size-systems.ts';
import { nextSize, sizeUnder } from '../electrical/stock.ts';
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

const OHMS_OF_AREA = { takes: [AREA], gives: OHMS_PER_METRE };
const areaOf = (si: readonly number[]): number => toMm2(at(si, 0));
const M_PER_KM = 1000;

/** Copper: its sizes in both systems and its resistance. A gauge is a pure number, 1/0 is 0. */
export const CONDUCTOR_FUNCTIONS: FunctionEntries = [
  [
    'tableOhms',
    fixed('table resistance of', OHMS_OF_AREA, (si) => classFiveOhmsPerKm(areaOf(si)) / M_PER_KM),
  ],
  [
    'classTwoOhms',
    fixed('class 2 resistance of', OHMS_OF_AREA, (si) => {
      return iecOhmsPerKm(areaOf(si), { strands: 'class 2', surface: 'plain' }) / M_PER_KM;
    }),
  ],
  [
    'tinnedOhms',
    fixed('tinned table resistance of', OHMS_OF_AREA, (si) => {
      return iecOhmsPerKm(areaOf(si), { strands: 'class 5', surface: 'tinned' }) / M_PER_KM;
    }),
  ],
  [
    'heatFactor',
    fixed('resistance factor at', { takes: [KELVIN], gives: PURE }, (si) =>
      resistanceAt(1, toCelsius(at(si, 0))),
    ),
  ],
  [
    'gaugeArea',
    fixed('copper area of gauge', { takes: [PURE], gives: AREA }, (si) =>
      fromMm2(gaugeAreaMm2(at(si, 0))),
    ),
  ],
  [
    'gaugeDiameter',
    fixed('wire diameter of gauge', { takes: [PURE], gives: METRES }, (si) => {
      return gaugeDiameterMm(at(si, 0)) / 1000;
    }),
  ],
  [
    'nextGauge',
    fixed('next gauge from', { takes: [AREA], gives: PURE }, (si) => nextGauge(areaOf(si))),
  ],
  [
    'gaugeOhms',
    fixed('table resistance of gauge', { takes: [PURE], gives: OHMS_PER_METRE }, (si) => {
      return gaugeOhmsPerKm(at(si, 0)) / M_PER_KM;
    }),
  ],
  [
    'nextCable',
    fixed('next stock size from', { takes: [AREA], gives: AREA }, (si, profile) =>
      fromMm2(nextSize(areaOf(si), stockAreasMm2(profile))),
    ),
  ],
  [
    'prevCable',
    fixed('stock size under', { takes: [AREA], gives: AREA }, (si, profile) =>
      fromMm2(sizeUnder(areaOf(si), stockAreasMm2(profile))),
    ),
  ],
  [
    'cableForDrop',
    fixed(
      'smallest size by the cable table for',
      { takes: [AMPS, METRES, VOLTS], gives: AREA },
      (si, profile) => {
        const run = { amps: at(si, 0), lengthM: at(si, 1), limitV: at(si, 2) };
        return fromMm2(sizeForDrop(run, profile));
      },
    ),
  ],
];
