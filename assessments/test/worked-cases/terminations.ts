import { type Case } from './case.ts';

export const terminationCases: Case[] = [
  {
    slug: 'te-joint-drop',
    source: 'known case 0.24 V, 28.8 W; arithmetic by bc: fall 120*.002, heat 120^2*.002',
    given: { resist: 2, load: 120 },
    results: { fall: 0.24, heat: 28.8 },
  },
  {
    slug: 'te-good-crimp',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: cable .78*.04, crimp 3.5/100, times .035/.0312',
    given: { area: 25, length: 40, load: 100, reading: 3.5 },
    results: { cable: 0.0312, crimp: 0.035, times: 1.12179487179 },
  },
  {
    slug: 'te-pull',
    source: 'arithmetic by bc: force 156, mass 156/9.81, add 156/9.81-1.5',
    given: { gauge: 12, hanger: 1.5 },
    results: { force: 156, mass: 15.9021406728, add: 14.4021406728 },
  },
  {
    slug: 'te-bond-millivolts',
    source: 'arithmetic by bc: resist 30/120, heat .03*120',
    given: { load: 120, reading: 30 },
    results: { resist: 0.25, heat: 3.6 },
  },
  {
    slug: 'te-three-joints',
    source: 'arithmetic by bc: last 120-8-30, resist 82/80, heat .082*80',
    given: { load: 80, total: 120, first: 8, cable: 30 },
    results: { last: 82, resist: 1.025, heat: 6.56 },
  },
  {
    slug: 'te-sample-batch',
    source: 'arithmetic by bc: force 15*9.81, more 147.15-133',
    given: { mass: 15, need: 133 },
    results: { force: 147.15, more: 14.15 },
  },
];
