import { within } from './out-of-range.ts';

/** Share of a device's rating a load may take for hours: NEC 125 % rule; for DC common practice. */
const CONTINUOUS_SHARE = 0.8;

/** Small craft devices may reach this share of the cable's table rating: 33 CFR 183.455. */
const SMALL_CRAFT_SHARE = 1.5;
const SMALL_CRAFT_UNDER_V = 50;

/** A load, the cable it hangs on, and the devices to be had. */
export interface DeviceJob {
  loadA: number;
  /** A load that runs for hours takes at most 80 % of its device. */
  continuous: boolean;
  /** What the cable carries after its conditions, A. */
  cableA: number;
  /** Ratings to be had, smallest first, A. */
  series: readonly number[];
}

/** A device between load and cable, or why there is none. */
export type DeviceChoice =
  | { fits: true; needA: number; ratingA: number; spareA: number }
  | { fits: false; needA: number; nextA: number | null; remedy: string };

const AMPS = { what: 'Current', unit: 'A', least: 0.01, most: 5000, remedy: 'give amperes' };

/**
 * Device between a load and its cable: the next rating the load needs, if the cable carries it.
 * Where it does not, no device fits and the cable must change: a larger device would leave the
 * cable to burn, a smaller one opens on the load.
 *
 * Source: NEC 125 % rule for continuous loads; for DC common practice, no source.
 *
 * @throws {OutOfRange} when load or cable is not 0.01 to 5000 A.
 * @example chooseDevice({ loadA: 30, continuous: true, cableA: 35, series: FUSE_RATINGS_A })
 */
export function chooseDevice(job: DeviceJob): DeviceChoice {
  const needA = within(job.loadA, AMPS) / (job.continuous ? CONTINUOUS_SHARE : 1);
  const cableA = within(job.cableA, AMPS);
  const nextA = job.series.find((rating) => rating >= needA * (1 - 1e-9)) ?? null;
  if (nextA === null) {
    const remedy = `no device of the series is rated ${tidy(needA)} A: share the load between circuits`;
    return { fits: false, needA, nextA, remedy };
  }
  if (nextA <= cableA * (1 + 1e-9)) {
    return { fits: true, needA, ratingA: nextA, spareA: Math.max(0, cableA - nextA) };
  }
  const remedy = `change the cable: it must carry ${nextA} A and carries ${tidy(cableA)} A`;
  return { fits: false, needA, nextA, remedy };
}

/**
 * Largest device the small craft rule allows on a cable, A. Allowed is not the same as good: a
 * derated cable wants a device it can carry. From 50 V the device is the table's value, and the
 * next rating up only if it stays within the share.
 *
 * Source: 33 CFR 183.455 (second-hand copy).
 *
 * @param cable - its rating in the table, without conditions, A, and the system's voltage.
 * @throws {OutOfRange} when the rating is not 0.01 to 5000 A.
 * @example mostSmallCraftA({ tableA: 80, volts: 12 }, FUSE_RATINGS_A) // 100, under 120
 */
export function mostSmallCraftA(
  cable: { tableA: number; volts: number },
  series: readonly number[],
): number | null {
  const tableA = within(cable.tableA, AMPS);
  const limitA = tableA * SMALL_CRAFT_SHARE;
  if (cable.volts < SMALL_CRAFT_UNDER_V) return largestWithin(series, limitA);
  const nextA = series.find((rating) => rating >= tableA) ?? null;
  return nextA !== null && nextA <= limitA ? nextA : largestWithin(series, tableA);
}

function largestWithin(series: readonly number[], limitA: number): number | null {
  return series.findLast((rating) => rating <= limitA * (1 + 1e-9)) ?? null;
}

function tidy(amps: number): string {
  return String(Number(amps.toPrecision(4)));
}
