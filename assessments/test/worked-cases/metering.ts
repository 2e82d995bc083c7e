import { type Case } from './case.ts';

export const meteringCases: Case[] = [
  {
    slug: 'mf-reconcile',
    // 30 A charger, 16.0457 A through the shunt, 2.4 A past it.
    source: 'circuit simulator ngspice 39.3, operating point, run outside this project',
    given: { charger: 30, monitor: 16.04570288, clamped: 10.7, bypass: 2.4 },
    results: { loads: 13.95429712, unseen: 3.25429712, battery: 13.64570288 },
  },
  {
    slug: 'mf-shunt',
    source:
      'class 0.5 on 500 A is 2.5 A; arithmetic by bc: tension 40*50/500, error .005*500, share 2.5/40*100',
    given: { rated: 500, class: 0.5, load: 40 },
    results: { tension: 4, error: 2.5, share: 6.25 },
  },
  {
    slug: 'mf-meter-spec',
    source:
      '0.5 % and 2 counts at 12.60 V is 0.083 V; arithmetic by bc: ofReading .005*12600, error 63+20, high 12.6+.083',
    given: { reading: 12.6, share: 0.5, counts: 2 },
    results: { ofReading: 63, error: 83, high: 12.683 },
  },
  {
    slug: 'mf-drop-budget',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: good 30*5*.00121, extra .5-.1815, holder .12/30*1000',
    given: { load: 30, area: 16, run: 5, overCable: 0.5, overHolder: 0.12 },
    results: { good: 0.1815, extra: 0.3185, holder: 4 },
  },
  {
    slug: 'mf-high-impedance',
    source: 'arithmetic by bc: shown 12.6*10/11, loaded 12600*30/1000030',
    given: { source: 12.6, leak: 1, input: 10 },
    results: { shown: 11.4545454545, loaded: 0.37798866034 },
  },
  {
    slug: 'mf-two-chargers-bar',
    source: 'arithmetic by bc: sum 35, left 29, missing 9',
    given: { mains: 10, road: 25, loads: 6, monitor: 20 },
    results: { sum: 35, left: 29, missing: 9 },
  },
  {
    slug: 'mf-small-shunt',
    source: 'arithmetic by bc: error .005*500, lost 2.5*10, better .005*100',
    given: { rated: 500, other: 100, class: 0.5, load: 1.5, night: 10 },
    results: { error: 2.5, lost: 25, better: 0.5 },
  },
  {
    slug: 'mf-dim-cabin',
    source: 'arithmetic by bc: both 12.6-11.2, back 1.4-.4, resist 1/6*1000, heat 1*6',
    given: { source: 12.6, lamp: 11.2, positive: 0.4, load: 6 },
    results: { both: 1.4, back: 1, resist: 166.666666667, heat: 6 },
  },
  {
    slug: 'mf-drain',
    source: 'arithmetic by bc: drain (.7+.5)/2, half 70/2, time 35/.6',
    given: { one: 0.7, other: 0.5, capacity: 70 },
    results: { drain: 0.6, half: 35, time: 58.3333333333 },
  },
  {
    slug: 'mf-record-row',
    source: 'arithmetic by bc: fall 12.7-12.4, share .3/12*100, resist .3/10*1000',
    given: { source: 12.7, load: 12.4, current: 10, limit: 3 },
    results: { fall: 0.3, share: 2.5, resist: 30 },
  },
];
