import { type Case } from './case.ts';

export const solarCases: Case[] = [
  {
    slug: 'so-cold-voc',
    source:
      'string case: 48.62 V by coefficient, 50.16 V by table, 50 V limit; arithmetic by bc: byPlate 2*22*(1+.003*35), byTable 2*22*1.14, margin 50-48.62',
    given: { panel: 22, slope: -0.3, cold: -10 },
    results: { byPlate: 48.62, byTable: 50.16, margin: 1.38 },
  },
  {
    slug: 'so-noct',
    source:
      'NOCT case: 56.25 °C, 175 W; arithmetic by bc: cell 25+25/800*1000, power 200*(1-.004*31.25)',
    given: { air: 25, noct: 45, sun: 1000, plate: 200, slope: -0.4 },
    results: { cell: 56.25, power: 175 },
  },
  {
    slug: 'so-tracker-or-not',
    source:
      'known case 70.4 W, 94.05 W, 7.35 A; arithmetic by bc: plain 12.8*5.5, tracked 18*5.5*.95, current 94.05/12.8',
    given: { panelVolts: 18, panelAmps: 5.5, battery: 12.8 },
    results: { plain: 70.4, tracked: 94.05, current: 7.34765625 },
  },
  {
    slug: 'so-fuse',
    source: 'arithmetic by bc: carried 6*1.5625, fuse 10',
    given: { short: 6, strings: 1 },
    results: { carried: 9.375, fuse: 10 },
  },
  {
    slug: 'so-budget',
    source:
      '2.5 mm² loses 12*.00798*9.425 = 0.903 V of 1.071 V; arithmetic by bc: energy 46*12.8, power 588.8/(2.5*.7), current 588.8/1.75/35.7, size 2.5, into 588.8/1.75*.95/12.8',
    given: { daily: 46, sun: 2.5, run: 6 },
    results: {
      energy: 588.8,
      power: 336.457142857,
      current: 9.42456982793,
      size: 2.5,
      into: 24.9714285714,
    },
  },
  {
    slug: 'so-boathouse-string',
    source:
      'household panel of 39.0 V gives 43.1 V at −10 °C; arithmetic by bc: one 39*(1+.003*35), string 2*39*(1+.003*35)',
    given: { panel: 39, slope: -0.3, cold: -10, limit: 100 },
    results: { one: 43.095, string: 86.19 },
  },
  {
    slug: 'so-hot-roof',
    source: 'arithmetic by bc: cell 30+28*1000/800, lost .4*(65-25)',
    given: { air: 30, rise: 28, sun: 1000, slope: -0.4 },
    results: { cell: 65, lost: 16 },
  },
  {
    slug: 'so-ferry-yield',
    source: 'arithmetic by bc: energy 300*3*.7, charge 630/12.8, balance 630/12.8-30',
    given: { plate: 300, sun: 3, share: 70, battery: 12.8, daily: 30 },
    results: { energy: 630, charge: 49.21875, balance: 19.21875 },
  },
  {
    slug: 'so-plain-loss',
    source: 'arithmetic by bc: best 18*5.5, plain 12.8*5.5, lost (1-12.8/18)*100',
    given: { panelVolts: 18, panelAmps: 5.5, battery: 12.8 },
    results: { best: 99, plain: 70.4, lost: 28.8888888889 },
  },
  {
    slug: 'so-shade-dip',
    source: 'loss of the dip: 7.8 A for half an hour; arithmetic by bc: short 12-4.2, lost 7.8*.5',
    given: { capacity: 110, charge: 45, limit: 40, tail: 2, sun: 12, shaded: 4.2, low: 4.2 },
    results: { short: 7.8, lost: 3.9 },
  },
];
