import { type Case } from './case.ts';

export const batteryCases: Case[] = [
  {
    slug: 'ba-bank',
    source: '2s2p of 12 V 110 Ah; arithmetic by bc: tension 24, charge 220, energy 24*220',
    given: { series: 2, parallel: 2, capacity: 110 },
    results: { tension: 24, charge: 220, energy: 5280 },
  },
  {
    slug: 'ba-peukert',
    source:
      'bc -l: 20*e(1.2*l(100/400)) is 3.789291 h, 75.786 Ah; arithmetic by bc: time 3.789291416, charge 20*3.789291416',
    given: { capacity: 100, power: 1.2, load: 20 },
    results: { time: 3.789291416, charge: 75.78582832 },
  },
  {
    slug: 'ba-usable',
    source: 'arithmetic by bc: bank 62*1.5/.5, spare 186-93',
    given: { daily: 62, between: 1.5, usable: 50 },
    results: { bank: 186, spare: 93 },
  },
  {
    slug: 'ba-return',
    source: 'arithmetic by bc: need 45/.85, into 25, time 45/.85/25',
    given: { used: 45, efficiency: 85, charger: 30, load: 5 },
    results: { need: 52.9411764706, into: 25, time: 2.11764705882 },
  },
  {
    slug: 'ba-sg',
    source:
      'FIST 3-6: 50 °F is nine steps of 3 °F under 77 °F; arithmetic by bc: shift -9*.001, corrected 1.226-.009',
    given: { above: -9, read: 1.226 },
    results: { shift: -0.009, corrected: 1.217 },
  },
  {
    slug: 'ba-tempcomp',
    source:
      'temperature compensation case: 14.76 V at 10 °C; arithmetic by bc: shift 6*4*15/1000, tension 14.4+.36',
    given: { point: 14.4, slope: -4, now: 10 },
    results: { shift: 0.36, tension: 14.76 },
  },
  {
    slug: 'ba-parallel-share',
    source:
      'known case 65.5 and 54.5 A; arithmetic by bc: far 6, near 120*6/11, other 120-120*6/11',
    given: { inside: 5, bridge: 0.5, load: 120 },
    results: { far: 6, near: 65.4545454545, other: 54.5454545455 },
  },
  {
    slug: 'ba-chain',
    source:
      'arithmetic by bc: cold 4.5*.35*24, light 15, heat 250*1.5/.9/12.8, daily 37.8+15+250*1.5/.9/12.8, bank (37.8+15+250*1.5/.9/12.8)/.8, time (37.8+15+250*1.5/.9/12.8)/.99/40',
    given: { fridge: 4.5, duty: 35, lights: 3, evening: 5, oven: 250, ovenTime: 1.5, charger: 40 },
    results: {
      cold: 37.8,
      light: 15,
      heat: 32.5520833333,
      daily: 85.3520833333,
      bank: 106.690104167,
      time: 2.15535563973,
    },
  },
  {
    slug: 'ba-buoy-bank',
    source: 'arithmetic by bc: daily 600/12.4, bank 600/12.4*3/.5',
    given: { wattage: 60, duration: 10, tension: 12.4, between: 3, usable: 50 },
    results: { daily: 48.3870967742, bank: 290.322580645 },
  },
  {
    slug: 'ba-hot-locker-point',
    source: 'arithmetic by bc: held 13.6+6*.004*5, proper 13.6-6*.004*20, over 13.72-13.12',
    given: { float: 13.6, slope: -4, battery: 45, wall: 20 },
    results: { held: 13.72, proper: 13.12, over: 0.6 },
  },
  {
    slug: 'ba-series-fault',
    source: 'arithmetic by bc: row 12.6+10.5, bank 240, energy 24*240',
    given: { one: 12.6, two: 10.5, capacity: 120 },
    results: { row: 23.1, bank: 240, energy: 5760 },
  },
  {
    slug: 'ba-night-heater',
    source: 'arithmetic by bc: may 100*(.9-.5), load 3.5, time 40/3.5',
    given: { capacity: 100, usable: 50, left: 90, fan: 2, fridge: 1.5, night: 10 },
    results: { may: 40, load: 3.5, time: 11.4285714286 },
  },
];
