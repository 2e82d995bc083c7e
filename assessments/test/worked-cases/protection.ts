import { type Case } from './case.ts';

export const protectionCases: Case[] = [
  {
    slug: 'pr-fuse-choice',
    source:
      'fuse choice case: 24 A, 30 A; arithmetic by bc: need 24/.8, fuse 30, carries 60*.68, spare 40.8-30',
    given: { load: 24, area: 6, factor: 0.68 },
    results: { need: 30, fuse: 30, carries: 40.8, spare: 10.8 },
  },
  {
    slug: 'pr-none-fits',
    source:
      'fuse choice case: 30 A, 37.5, 40 A over the cable; 40/.6 = 66.7 A, so 10 mm² at 80 A; arithmetic by bc: need 30/.8, fuse 40, carries 60*.6, size 10',
    given: { load: 30, factor: 0.6 },
    results: { need: 37.5, fuse: 40, carries: 36, size: 10 },
  },
  {
    slug: 'pr-150',
    source:
      '33 CFR 183.455: 150 % of table 5; arithmetic by bc: table 80, allowed 80*1.5, carries 80*.86, fuse 60',
    given: { area: 10, factor: 0.86 },
    results: { table: 80, allowed: 120, carries: 68.8, fuse: 60 },
  },
  {
    slug: 'pr-fault-current',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: main 2*.554, first 13.2/(.004+.0005+.001108), branch 2*6*1.21, last 13.2/(.004+.0005+.001108+.01452)',
    given: { emf: 13.2, inside: 4, thick: 35, near: 1, thin: 16, far: 6 },
    results: { main: 1.108, first: 2353.78031384, branch: 14.52, last: 655.802861685 },
  },
  {
    slug: 'pr-interrupt',
    source: '2357 A is over 2000; arithmetic by bc: fault 13.2/.0056, type 20000',
    given: { emf: 13.2, loop: 5.6 },
    results: { fault: 2357.14285714, type: 20000 },
  },
  {
    slug: 'pr-far-end-opens',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: loop 6+2*9*13.3, fault 12.7/.2454, times 12.7/.2454/15',
    given: { source: 6, area: 1.5, run: 9, fuse: 15 },
    results: { loop: 245.4, fault: 51.7522412388, times: 3.45014941592 },
  },
  {
    slug: 'pr-feed-chain',
    source:
      '50 A over 0.8 is 62.5, so 70 A; 70/.73 = 95.9 A, so 16 mm²; 16 mm² loses 0.545 V, 25 mm² 0.351 V; arithmetic by bc: input 40*14.4/(.9*12.8), fuse 70, forCurrent 16, forDrop 25, size 25, fault 12.8/(.007+2*4.5*.00078)',
    given: { output: 40, inVolts: 12.8, run: 4.5, factor: 0.73 },
    results: { input: 50, fuse: 70, forCurrent: 16, forDrop: 25, size: 25, fault: 912.981455064 },
  },
  {
    slug: 'pr-lighting-chain',
    source:
      '1.5 mm² would lose 2*8*.0133*6 = 1.277 V; arithmetic by bc: current 6*12/12, fuse 7.5, limit .1*12, size 2.5, fall 2*8*.00798*6',
    given: { lamps: 6, each: 12, run: 8, allowed: 10 },
    results: { current: 6, fuse: 7.5, limit: 1.2, size: 2.5, fall: 0.76608 },
  },
  {
    slug: 'pr-hot-locker',
    source:
      'house table 4 mm² 45 A; arithmetic by bc: need 20/.8, fuse 25, carries 45*.8, largest 35',
    given: { load: 20, area: 4, factor: 0.8 },
    results: { need: 25, fuse: 25, carries: 36, largest: 35 },
  },
  {
    slug: 'pr-inverter-short',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: pair 2*2*.272, loop 4+.6+1.088, fault 26.4/.005688',
    given: { emf: 26.4, inside: 4, joints: 0.6, area: 70, run: 2 },
    results: { pair: 1.088, loop: 5.688, fault: 4641.35021097 },
  },
  {
    slug: 'pr-winch-tail',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: loop 8+2*8*7.98, fault 12.7/.13568, times 12.7/.13568/60',
    given: { source: 8, area: 2.5, run: 8, fuse: 60 },
    results: { loop: 135.68, fault: 93.6025943396, times: 1.56004323899 },
  },
  {
    slug: 'pr-workshop-circuit',
    source:
      '15/.8 = 18.75, so 20 A; 20/.7 = 28.6 A, so 2.5 mm² at 35 A; arithmetic by bc: current 180/12, fuse 20, size 2.5, fall 15*2*4*.00798',
    given: { power: 180, supply: 12, factor: 0.7, run: 4 },
    results: { current: 15, fuse: 20, size: 2.5, fall: 0.9576 },
  },
];
