import { type Case } from './case.ts';

export const conductorCases: Case[] = [
  {
    slug: 'co-pair-rho',
    source: 'arithmetic by bc: pair .0175*11/4*1000',
    given: { run: 5.5, area: 4 },
    results: { pair: 48.125 },
  },
  {
    slug: 'co-pair-table',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: perMetre 4.95, pair 2*5.5*4.95',
    given: { run: 5.5, area: 4 },
    results: { perMetre: 4.95, pair: 54.45 },
  },
  {
    slug: 'co-hot',
    source:
      '6 mm² at 60 °C is 3.8188 mΩ/m; arithmetic by bc: pair 2*4*3.3, factor 1+.00393*40, hot 26.4*(1+.00393*40)',
    given: { run: 4, area: 6, warm: 60 },
    results: { pair: 26.4, factor: 1.1572, hot: 30.55008 },
  },
  {
    slug: 'co-awg-metric',
    source: 'GNU units: awg(8) is 8.3656 mm²; arithmetic by bc: area 8.37, size 10',
    given: { gauge: 8 },
    results: { area: 8.37, size: 10 },
  },
  {
    slug: 'co-awg-formula',
    source:
      'GNU units: awg(10) 2.58818673 mm, 5.26115496 mm²; arithmetic by bc: wire 2.58818673, area 5.26115496',
    given: { gauge: 10 },
    results: { wire: 2.58818673, area: 5.26115496 },
  },
  {
    slug: 'co-mast-cable',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: perMetre 7.98, pair 2*12*7.98, fall 1.5*.19152',
    given: { run: 12, area: 2.5, load: 1.5 },
    results: { perMetre: 7.98, pair: 191.52, fall: 0.28728 },
  },
  {
    slug: 'co-heated-floor',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: pair 12*4.95, hot 59.4*(1+.00393*40), fall 10*.0594*(1+.00393*40), more 10*59.4*.00393*40',
    given: { run: 6, area: 4, warm: 60, load: 10 },
    results: { pair: 59.4, hot: 68.73768, fall: 0.6873768, more: 93.3768 },
  },
  {
    slug: 'co-reel-ends',
    source:
      'class 5 table (IEC 60228, from memory); arithmetic by bc: perMetre 7.98, length 240/7.98, run 240/7.98/2',
    given: { area: 2.5, resist: 240 },
    results: { perMetre: 7.98, length: 30.0751879699, run: 15.037593985 },
  },
  {
    slug: 'co-gauge-swap',
    source:
      'GNU units: awg(0) 53.475 mm², awg(6) 13.302 mm²; arithmetic by bc: asked 53.4751207, have 13.3017679, count 53.4751207/13.3017679',
    given: { gauge: 0, thinner: 6 },
    results: { asked: 53.4751207, have: 13.3017679, count: 4.02015138905 },
  },
];
