import { type Case } from './case.ts';

export const voltageDropCases: Case[] = [
  {
    slug: 'vd-chart-table',
    source: 'worked by hand: 0.0175 × 11 ÷ 4 = 48.1 mΩ, × 14 A = 0.674 V, 5.3 %, 7.0 mm², so 10',
    given: { load: 14, run: 5.5, area: 4 },
    results: { pair: 48.125, fall: 0.67375, share: 5.263672, need: 7.01823, size: 10 },
  },
  {
    slug: 'vd-table-decides',
    source: 'test/reference/voltage-drop-cases.csv, first case: area says 10 mm², the table 16',
    given: { load: 20, run: 5 },
    results: { limit: 0.36, need: 9.57778, first: 10, firstFall: 0.382, size: 16, fall: 0.242 },
  },
  {
    slug: 'vd-measured-joint',
    // A 0.150 Ω joint in 5 m of 6 mm²: 9.175627 A, 1.527742 V along the return.
    source: 'circuit simulator ngspice 39.3, operating point, run outside this project',
    given: { load: 9.17562724, reading: 1.527741935, area: 6, run: 5 },
    results: { joint: 1.376344086, jointOhms: 150, heat: 12.62882029 },
  },
  {
    slug: 'vd-deck-lamps',
    source: 'by hand: 2 × 2 m × 7.98 mΩ/m = 31.92 mΩ, and 3 + 2 + 1 times 2 A of it',
    given: { lamp: 2, section: 2, area: 2.5 },
    results: { pair: 31.92, first: 0.19152, last: 0.06384, total: 0.38304 },
  },
  {
    slug: 'vd-charger-feed',
    source: 'quadratic solved by hand for 626.087 W behind 12.1 mΩ at 13.9 V',
    given: { output: 576, source: 13.9, area: 16, run: 5 },
    results: { input: 626.087, pair: 12.1, current: 46.9619, fall: 0.568239 },
  },
  {
    slug: 'vd-winch-pump',
    source:
      'house table and class 5 table by hand: 28 ÷ 0.68 = 41.2 A, so 4 mm²; 0.36 V, so 16 mm²',
    given: { load: 28, run: 3.5, allowed: 3, factor: 0.68 },
    results: { forCurrent: 4, limit: 0.36, forDrop: 16, size: 16 },
  },
];
