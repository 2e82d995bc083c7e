import { type Case } from './case.ts';

export const isolationCases: Case[] = [
  {
    slug: 'si-bleed-down',
    source: 'closed form by hand: 22 s × ln 12.8 = 56.09 s',
    given: { capacitor: 10, bleed: 2.2, start: 12.8 },
    results: { constant: 22, wait: 56.0879 },
  },
  {
    slug: 'si-spanner',
    source: 'circuit simulator ngspice 39.3, operating point, run outside this project',
    given: { source: 12.7, inner: 5 },
    results: { current: 2116.66667, heat: 4480.277778 },
  },
  {
    slug: 'si-hydrogen-volume',
    // Faraday and 22.414 L/mol by GNU units: 1 Ah through one cell makes 0.41815 L.
    source: 'by hand: 0.418 L × 5 × 4 × 6 = 50.16 L; over 0.04 it is 1254 L',
    given: { overcharge: 5, span: 4, cells: 6 },
    results: { made: 50.16, mixture: 1254 },
  },
  {
    slug: 'si-tow-bar',
    source: 'circuit simulator ngspice 39.3, 12.6 V + 5 mΩ twice across 3 mΩ; heat 5.815385²/0.003',
    given: { source: 12.6, inner: 5, steel: 3 },
    results: { loop: 13, current: 1938.462, heat: 11272.9 },
  },
  {
    slug: 'si-after-the-wait',
    source:
      'circuit simulator ngspice 39.3, transient of 60 s, 14.28405 V; closed form by bc agrees',
    given: { capacitor: 4.7, bleed: 10, start: 51.2, waited: 60 },
    results: { constant: 47, remains: 14.28405 },
  },
  {
    slug: 'si-locker-hours',
    source: 'GNU units 2.22: 3 L / (0.418 L/Ah × 1 A × 12) = 35.885167 min',
    given: { overcharge: 1, cells: 12, locker: 300 },
    results: { allowed: 3, perHour: 5.016, lasts: 35.885167 },
  },
];
