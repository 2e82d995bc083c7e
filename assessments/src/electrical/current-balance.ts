import { within } from './out-of-range.ts';

/** What the instruments of a house bank show, A. Charging is positive on the monitor. */
export interface BalanceReadings {
  chargerA: number;
  monitorA: number;
  /** Loads on the bar that could be clamped. */
  clampedA: number;
  /** Loads wired to the battery's own post, past the shunt. */
  bypassA: number;
}

export interface CurrentBalance {
  /** All loads on the bar: charger less monitor. */
  loadsA: number;
  /** Load on the bar that no clamp has found yet. */
  unseenA: number;
  /** What really goes into the battery. */
  batteryA: number;
  /** All loads, those past the shunt too. */
  allLoadsA: number;
}

/**
 * Charger against battery monitor against loads, by Kirchhoff's first law at the negative bar.
 *
 * The monitor's shunt must be the only way to the battery's negative for its figure to be the
 * battery's; a load on the post is not in `loadsA` and takes from `batteryA` unseen.
 *
 * @throws {OutOfRange} when a current is beyond the trade, or a load is negative.
 * @example
 * balanceCurrents({ chargerA: 30, monitorA: 16, clampedA: 11.6, bypassA: 2.4 })
 * // loads 14, unseen 2.4, battery 13.6, all loads 16.4
 */
export function balanceCurrents(readings: BalanceReadings): CurrentBalance {
  const { chargerA, monitorA, clampedA, bypassA } = readings;
  requireAmps(chargerA, 'Charger’s current', 0);
  requireAmps(monitorA, 'Monitor’s current', -2000);
  requireAmps(clampedA, 'Clamped loads', 0);
  requireAmps(bypassA, 'Loads past the shunt', 0);
  const loadsA = chargerA - monitorA;
  return {
    loadsA,
    unseenA: loadsA - clampedA,
    batteryA: monitorA - bypassA,
    allLoadsA: loadsA + bypassA,
  };
}

function requireAmps(amps: number, what: string, least: number): void {
  within(amps, {
    what,
    unit: 'A',
    least,
    most: 2000,
    remedy: 'give it in amperes as the instrument shows it',
  });
}
