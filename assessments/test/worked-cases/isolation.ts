import { type Case } from './case.ts';

export const isolationCases: Case[] = [
  {
    slug: 'si-bleed-down',
    source: 'closed form by hand: 22 s × ln 12.8 = 56.09 s',
    given: { capacitor: 10, bleed: 2.2, start: 12.8 },
    results: { constant: 22, wait: 56.0879 },
  },
];
