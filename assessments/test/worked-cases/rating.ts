import { type Case } from './case.ts';

export const ratingCases: Case[] = [
  {
    slug: 'rd-chain',
    source: 'tables of 33 CFR 183.425 and BS 7671 4C1 by hand: 80 × 0.8563 × 0.70',
    given: { area: 10, ambient: 50, circuits: 3, load: 45 },
    results: { rated: 80, heat: 0.856349, bunch: 0.7, carries: 47.95554, spare: 2.95554 },
  },
  {
    slug: 'rd-engine-space',
    source: '33 CFR 183.425 table 5 and note 1 by hand: 80 × 0.85',
    given: { area: 10, jacket: 105 },
    results: { rated: 80, factor: 0.85, carries: 68 },
  },
  {
    slug: 'rd-roof-void',
    source: 'formula by hand: √(40/60) = 0.8165, × 55 A',
    given: { jacket: 90, ambient: 50, rated: 55 },
    results: { factor: 0.8164966, carries: 44.90731 },
  },
];
