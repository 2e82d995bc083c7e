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
  {
    slug: 'vd-share-nominal',
    source: 'arithmetic by bc: ofNominal .42/12*100, ofSupply .42/12.8*100',
    given: { fall: 0.42, supply: 12.8 },
    results: { ofNominal: 3.5, ofSupply: 3.28125 },
  },
  {
    slug: 'vd-chassis-return',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: out 4.5*4.95, path out+2, fall 12*path/1000',
    given: { load: 12, run: 4.5, area: 4, body: 2 },
    results: { out: 22.275, path: 24.275, fall: 0.2913 },
  },
  {
    slug: 'vd-several-loads',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: drop1 (2+2*1.5)*2*3*.00798, drop2 2*1.5*2*2*.00798, drop3 1.5*2*2*.00798, total drop1+drop2+drop3',
    given: { near: 2, far: 1.5, first: 3, section: 2, area: 2.5 },
    results: { drop1: 0.2394, drop2: 0.09576, drop3: 0.04788, total: 0.38304 },
  },
  {
    slug: 'vd-shared-return',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: positive 4*7.98, back 4*4.95, alone 12.6-3*.05172, both 12.6-3*.03192-11*.0198, dip 8*19.8',
    given: { lights: 3, pump: 8, run: 4, own: 2.5, shared: 4 },
    results: { positive: 31.92, back: 19.8, alone: 12.44484, both: 12.28644, dip: 158.4 },
  },
  {
    slug: 'vd-cmil',
    source:
      'reference example 12 V, 10 A, 21 ft, 3 %: 6271 cmil, 12 AWG; arithmetic by bc: limit .03*12, mils 10.75*10*21/.36, metric 10.75*10*21/.36*.00050670747909749772, pick 6530',
    given: { load: 10, run: 21 },
    results: { limit: 0.36, mils: 6270.83333333, metric: 3.17747815017, pick: 6530 },
  },
  {
    slug: 'vd-constant-power-run',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: input 560/.9, pair 2*5*1.21, seen (13.8+sqrt(13.8^2-4*(560/.9)*.0121))/2, current (560/.9)/seen, fall 13.8-seen',
    given: { output: 560, source: 13.8, area: 16, run: 5 },
    results: {
      input: 622.222222222,
      pair: 12.1,
      seen: 13.2309644693,
      current: 47.0277298127,
      fall: 0.569035530734,
    },
  },
  {
    slug: 'vd-size-two-rules',
    source:
      'house table: 4 mm² 45 A is the first over 41.2 A; 10 mm² would lose 2*3.5*.00191*28 = 0.374 V, 16 mm² 0.237 V; arithmetic by bc: need 28/.68, forCurrent 4, limit .03*12, forDrop 16, size 16',
    given: { load: 28, run: 3.5, supply: 12, allowed: 3, factor: 0.68 },
    results: { need: 41.1764705882, forCurrent: 4, limit: 0.36, forDrop: 16, size: 16 },
  },
  {
    slug: 'vd-textbook-long',
    source:
      'Lessons in Electric Circuits vol. I ch. 12 prints 0.2 Ω and 116 035 cmil; arithmetic by bc: each 10/2/25, mils 10.09*2300/(10/2/25)',
    given: { run: 2300, load: 25, fallAllowed: 10 },
    results: { each: 0.2, mils: 116035 },
  },
  {
    slug: 'vd-stern-joint',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: good 9*5*.0033, joint 1.5-good, resist joint/9*1000, heat joint*9',
    given: { load: 9, positive: 1.5, area: 6, run: 5 },
    results: { good: 0.1485, joint: 1.3515, resist: 150.166666667, heat: 12.1635 },
  },
  {
    slug: 'vd-crane-return',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: back 4*1.91, lift 24*7.64, dip 20*7.64, other 4*4*4.95',
    given: { heater: 4, winch: 20, run: 4, shared: 10, twin: 4 },
    results: { back: 7.64, lift: 183.36, dip: 152.8, other: 79.2 },
  },
];
