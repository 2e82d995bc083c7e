import { type Case } from './case.ts';

const NGSPICE = 'circuit simulator ngspice 39.3, operating point, run outside this project';

export const circuitCases: Case[] = [
  {
    slug: 'cl-amps-from-watts',
    source: 'GNU units 2.22: 4 × 24 W / 12.6 V = 7.6190476 A',
    given: { lamps: 4, each: 24, supply: 12.6 },
    results: { power: 96, current: 7.6190476 },
  },
  {
    slug: 'cl-lamp-low-volts',
    source: `13.5² / 55 by hand; the lamp at 12.0 V by ${NGSPICE}`,
    given: { marked: 55, found: 12 },
    results: { path: 3.313636364, power: 43.45679012 },
  },
  {
    slug: 'cl-constant-power',
    source: 'general calculator bc: 240/13.4, 240/11.8 and their ratio less one',
    given: { power: 240, high: 13.4, low: 11.8 },
    results: { before: 17.910447761, after: 20.33898305, rise: 13.55932203 },
  },
  {
    slug: 'cl-ah-to-wh',
    source: 'GNU units 2.22: 110 Ah × 12.8 V = 1408 Wh',
    given: { capacity: 110, voltage: 12.8 },
    results: { energy: 1408 },
  },
  {
    slug: 'cl-duty',
    source: 'by hand: 4.8 A × 0.35 = 1.68 A; × 24 h = 40.32 Ah',
    given: { running: 4.8, duty: 35 },
    results: { mean: 1.68, daily: 40.32 },
  },
  {
    slug: 'cl-series-parallel-load',
    source: NGSPICE,
    given: { lamp: 12, lead: 0.2 },
    results: { pair: 6, current: 2.03225806, reached: 12.19354839 },
  },
  {
    slug: 'cl-circuit-01',
    source: NGSPICE,
    given: { source: 12.8, inner: 10, fitted: 6, run: 5, load: 1.2 },
    results: {
      perMetre: 3.3,
      pair: 33,
      current: 10.2811245,
      post: 12.69718876,
      reached: 12.3373494,
      fall: 0.3598393574,
    },
  },
  {
    slug: 'cl-heat-in-joint',
    // A loop of battery, fuse, 6 mm² pair and 1.2 Ω with the joint in its negative.
    source: NGSPICE,
    given: { joint: 0.15, load: 9.175627 },
    results: { fall: 1.376344, heat: 12.62882 },
  },
  {
    slug: 'cl-open-circuit-volts',
    source: 'by hand: 12.6 V − 3.1 V = 9.5 V; 9.5 V / 0.35 A = 27.142857 Ω',
    given: { open: 12.6, loaded: 3.1, load: 0.35 },
    results: { lost: 9.5, feed: 27.142857 },
  },
  {
    slug: 'cl-kirchhoff-busbar',
    source: NGSPICE,
    given: { charger: 30, fridge: 3.5, lights: 7.2, pump: 3.3 },
    results: { loads: 14, battery: 16, stopped: 14 },
  },
  {
    slug: 'cl-urn-on-charge',
    source: 'general calculator bc: 12²/150, 14²/0.96 and half of it for half an hour',
    given: { marked: 150, found: 14, span: 30 },
    results: { element: 0.96, power: 204.1666667, energy: 102.0833333 },
  },
  {
    slug: 'cl-inverter-saw',
    source: 'general calculator bc: 1000/0.9, the same over 12, a quarter of that for 15 min',
    given: { saw: 1000, share: 90, supply: 12, span: 15 },
    results: { input: 1111.111111, current: 92.59259259, used: 23.14814815 },
  },
  {
    slug: 'cl-workboat-bar',
    source: 'by hand: 24 + 8 − 10 = 22 A; × 13.6 V = 299.2 W; 90 Ah / 22 A = 4.0909091 h',
    given: { charger: 24, panel: 8, battery: 10, supply: 13.6, usable: 90 },
    results: { loads: 22, power: 299.2, lasts: 4.0909091 },
  },
  {
    slug: 'cl-pads-in-series',
    source: `${NGSPICE}: 2.4 Ω and 4.8 Ω in series on 25.6 V; power by hand, 17.0666667 × 3.5555556`,
    given: { larger: 60, smaller: 30, supply: 25.6 },
    results: { other: 4.8, current: 3.55555556, across: 17.06666667, power: 60.68148148 },
  },
  {
    slug: 'cl-warm-plug',
    source: 'general calculator bc: 0.62/14.5, 0.62 × 14.5 and 0.035 × 14.5',
    given: { fall: 0.62, load: 14.5, after: 35 },
    results: { pin: 42.758620689, heat: 8.99, cooler: 0.5075 },
  },
];
