import { type Drawn } from './drawing-data.ts';

/** What the reader has set. */
export interface BalanceSet {
  chargerA: number;
  /** Names of what is switched on. */
  on: ReadonlySet<string>;
}

export interface Balance {
  chargerA: number;
  /** On the bar, where the shunt counts them. */
  loadsA: number;
  /** Through the shunt, plus into the battery. */
  monitorA: number;
  bypassA: number;
  batteryA: number;
}

export function balanceOf({ loads, bypass }: Drawn<'current-balance'>, set: BalanceSet): Balance {
  const { chargerA, on } = set;
  const loadsA = loads.reduce((sum, { name, amps }) => sum + (on.has(name) ? amps : 0), 0);
  const monitorA = chargerA - loadsA;
  const bypassA = on.has(bypass.name) ? bypass.amps : 0;
  return { chargerA, loadsA, monitorA, bypassA, batteryA: monitorA - bypassA };
}
