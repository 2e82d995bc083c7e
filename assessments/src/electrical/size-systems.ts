import { gaugeAreaMm2, STOCK_GAUGES } from './gauge.ts';
import { OutOfRange, within } from './out-of-range.ts';
import { type PracticeProfile } from './practice-profile.ts';
import { CABLE_AREAS_MM2, nearestSize, nextSize } from './stock.ts';

/** Copper areas of the stock gauges, mm², smallest first. */
const GAUGE_AREAS_MM2: readonly number[] = STOCK_GAUGES.map(gaugeAreaMm2);
const KNOWN_GAUGES = [18, ...STOCK_GAUGES].map((gauge) => ({
  gauge,
  areaMm2: gaugeAreaMm2(gauge),
}));

/** Stock cable of a practice by its copper area, mm², smallest first. */
export function stockAreasMm2(profile: Pick<PracticeProfile, 'sizes'>): readonly number[] {
  return profile.sizes === 'metric' ? CABLE_AREAS_MM2 : GAUGE_AREAS_MM2;
}

/**
 * Thinnest stock gauge whose copper is not under the area.
 *
 * @throws {OutOfRange} when the area is above 4/0 or not a positive number.
 * @example nextGauge(6) // 8
 */
export function nextGauge(areaMm2: number): number {
  return gaugeOfArea(nextSize(areaMm2, GAUGE_AREAS_MM2));
}

/**
 * Stock gauge whose copper is nearest the area by ratio. Nearest may be smaller: for a rating or
 * a drop take the next one.
 *
 * @throws {OutOfRange} when the area is not 1 to 120 mm².
 * @example nearestGauge(6) // 10
 */
export function nearestGauge(areaMm2: number): number {
  return gaugeOfArea(nearestSize(inStock(areaMm2), GAUGE_AREAS_MM2));
}

/**
 * Smallest stock metric size whose copper is not under the gauge's, mm².
 *
 * @throws {OutOfRange} when the gauge is none.
 * @example nextMetric(10) // 6
 */
export function nextMetric(gauge: number): number {
  return nextSize(gaugeAreaMm2(gauge), CABLE_AREAS_MM2);
}

/**
 * Stock metric size whose copper is nearest the gauge's by ratio, mm².
 *
 * @throws {OutOfRange} when the gauge is none, or outside 16 AWG to 4/0.
 * @example nearestMetric(12) // 4
 */
export function nearestMetric(gauge: number): number {
  return nearestSize(inStock(gaugeAreaMm2(gauge)), CABLE_AREAS_MM2);
}

/**
 * Gauge of a copper area that is one, to a hundredth of a per cent.
 *
 * @throws {OutOfRange} when the area is no stock gauge's.
 */
export function gaugeOfArea(areaMm2: number): number {
  const known = KNOWN_GAUGES.find((one) => Math.abs(one.areaMm2 / areaMm2 - 1) < 1e-4);
  if (known) return known.gauge;
  throw new OutOfRange(`${areaMm2} mm² is the copper of no gauge; take the next gauge from it.`);
}

function inStock(areaMm2: number): number {
  return within(areaMm2, {
    what: 'Copper area',
    unit: 'mm²',
    least: 1,
    most: 120,
    remedy: 'stock cable lies between; smaller and larger conductors have no near stock size',
  });
}
