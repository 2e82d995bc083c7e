import { type Case } from './case.ts';

export const meteringCases: Case[] = [
  {
    slug: 'mf-reconcile',
    // 30 A charger, 16.0457 A through the shunt, 2.4 A past it.
    source: 'circuit simulator ngspice 39.3, operating point, run outside this project',
    given: { charger: 30, monitor: 16.04570288, clamped: 10.7, bypass: 2.4 },
    results: { loads: 13.95429712, unseen: 3.25429712, battery: 13.64570288 },
  },
];
