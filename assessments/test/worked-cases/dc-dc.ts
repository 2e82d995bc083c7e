import { type Case } from './case.ts';

export const dcDcCases: Case[] = [
  {
    slug: 'da-input-current',
    source: 'alternator case: 47.43083 A; arithmetic by bc: power 40*14.4, input 576/(.92*13.2)',
    given: { output: 40, outVolts: 14.4, efficiency: 92, inVolts: 13.2 },
    results: { power: 576, input: 47.4308300395 },
  },
  {
    slug: 'da-alternator-left',
    source:
      'alternator case: 25.4 A at hot idle; arithmetic by bc: warm 120*.7, atIdle 84*.6-25, onRoad 84-25',
    given: { plate: 120, hot: 70, idle: 60, vehicle: 25 },
    results: { warm: 84, atIdle: 25.4, onRoad: 59 },
  },
  {
    slug: 'da-two-chargers',
    source:
      'arithmetic by bc: one 30*13.6/(.9*12.9), need 28+2*30*13.6/(.9*12.9), short 28+2*30*13.6/(.9*12.9)-75, eased 28+30*13.6/(.9*12.9), spare 75-28-30*13.6/(.9*12.9)',
    given: { limit: 75, vehicle: 28, output: 30, inVolts: 12.9 },
    results: {
      one: 35.142118863,
      need: 98.2842377261,
      short: 23.2842377261,
      eased: 63.142118863,
      spare: 11.857881137,
    },
  },
  {
    slug: 'da-override-time',
    source:
      'ngspice 39.3: 49.569126 A out of the start battery; arithmetic by bc: tension (12.6+sqrt(12.6^2-24))/2, current 49.5691257, time 30/49.5691257',
    given: { power: 600, inside: 10, capacity: 60 },
    results: { tension: 12.1043087444, current: 49.5691257, time: 0.605215435543 },
  },
  {
    slug: 'da-offload-look',
    source:
      'trade case: 20 looks an hour, mean 38.888889 A; arithmetic by bc: lifts 21.1*15.3, times 20, mean 40*175/180',
    given: { current: 21.1, path: 15.3, full: 40, pause: 5, every: 180 },
    results: { lifts: 322.83, times: 20, mean: 38.8888888889 },
  },
  {
    slug: 'da-low-input',
    source: 'arithmetic by bc: atJoint 40*.041, atCable 40*6.1, atBond 40*3.4, seen 12.7-40*.0505',
    given: { source: 12.7, current: 40, joint: 41, cable: 6.1, bond: 3.4 },
    results: { atJoint: 1.64, atCable: 244, atBond: 136, seen: 10.68 },
  },
  {
    slug: 'da-quiet',
    source:
      'trade case: 0.902256 and 2.105263 h; arithmetic by bc: normal 30/.95/35, quiet 30/.95/15, ratio 35/15',
    given: { used: 30, full: 40, load: 5 },
    results: { normal: 0.902255639098, quiet: 2.10526315789, ratio: 2.33333333333 },
  },
  {
    slug: 'da-quiet-timeout',
    source: 'arithmetic by bc: need 60/.95, got 45, time 3+(60/.95-45)/35',
    given: { used: 60, full: 40, load: 5, timeout: 3 },
    results: { need: 63.1578947368, got: 45, time: 3.51879699248 },
  },
  {
    slug: 'da-chain',
    source:
      '36.9/.8 = 46.2, so 50 A; 50/.73 = 68.5 A, so 10 mm²; 10 mm² loses 0.564 V, 16 mm² 0.357 V; arithmetic by bc: most 110*.7*.5, mostOut 38.5*.9*13/14.4, output 30, input 30*14.4/(.9*13), fuse 50, size 16',
    given: { plate: 110, efficiency: 90, run: 4, factor: 0.73 },
    results: {
      most: 38.5,
      mostOut: 31.28125,
      output: 30,
      input: 36.9230769231,
      fuse: 50,
      size: 16,
    },
  },
  {
    slug: 'da-horsebox-input',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: input 30*14.4/(.9*13), fall 30*14.4/(.9*13)*8*.00121, source 13+30*14.4/(.9*13)*8*.00121',
    given: { output: 30, outVolts: 14.4, efficiency: 90, inVolts: 13, area: 16, run: 4 },
    results: { input: 36.9230769231, fall: 0.357415384615, source: 13.3574153846 },
  },
  {
    slug: 'da-idle-in-traffic',
    source: 'arithmetic by bc: gives 120*.7*.5, short 24+40-42, time 35/22',
    given: { plate: 120, hot: 70, idle: 50, vehicle: 24, input: 40, capacity: 70 },
    results: { gives: 42, short: 22, time: 1.59090909091 },
  },
  {
    slug: 'da-quiet-night',
    source: 'arithmetic by bc: into 14, charge 84, stays 84*.9',
    given: { full: 40, load: 6, night: 6, efficiency: 90 },
    results: { into: 14, charge: 84, stays: 75.6 },
  },
  {
    slug: 'da-tug-feed',
    source:
      '49.2/.8 = 61.5, so 70 A; 70/.68 = 102.9 A, so 16 mm²; it loses 0.596 V of 0.72 V; arithmetic by bc: input 40*28.8/(.9*26), fuse 70, forCurrent 16, size 16',
    given: { output: 40, efficiency: 90, inVolts: 26, run: 5, factor: 0.68 },
    results: { input: 49.2307692308, fuse: 70, forCurrent: 16, size: 16 },
  },
  {
    slug: 'da-offload-curve',
    source: 'arithmetic by bc: gap 180, mean 30*174/180, lifts 14-13.6',
    given: {
      capacity: 110,
      charge: 50,
      limit: 30,
      tail: 2,
      every: 180,
      look: 6,
      alternator: 14,
      cable: 12,
      loaded: 13.6,
    },
    results: { gap: 180, mean: 29, lifts: 0.4 },
  },
];
