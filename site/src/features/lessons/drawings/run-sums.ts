import { type Drawn } from './drawing-data.ts';

/** What the reader has set. */
export interface RunSet {
  lengthM: number;
  areaMm2: number;
  amps: number;
}

/** Volts along a two-wire run, against the minus post. */
export interface RunVolts {
  /** Lost in one conductor. */
  eachV: number;
  lostV: number;
  plusV: number;
  minusV: number;
  leftV: number;
  percent: number;
}

/** Out and back: both conductors lose the same. */
export function runVolts({ supplyV, areas }: Drawn<'voltage-run'>, set: RunSet): RunVolts {
  const ohmsPerM = areas.find(({ areaMm2 }) => areaMm2 === set.areaMm2)?.ohmsPerM ?? 0;
  const eachV = set.lengthM * set.amps * ohmsPerM;
  const lostV = 2 * eachV;
  return {
    ...{ eachV, lostV, plusV: supplyV - eachV, minusV: eachV, leftV: supplyV - lostV },
    percent: (100 * lostV) / supplyV,
  };
}

/** "Over the 0.36 V of 3 % of 12 V, ..." for each limit. */
export function sayLimits({ limits }: Drawn<'voltage-run'>, { lostV }: RunVolts): string {
  return limits
    .map(({ volts, label }) => {
      const word = lostV > volts ? 'Over' : 'Within';
      return `${word} ${volts.toFixed(2)}\u2009V, ${label}.`;
    })
    .join(' ');
}
