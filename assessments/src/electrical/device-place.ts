import { within } from './out-of-range.ts';

/** Reach of a device from its source, mm: 7 in, or 40 in where the cable is sheathed. */
const REACH_MM = { bare: 177.8, sheathed: 1016 };

/**
 * Whether a device is near enough to its source, and by how much, mm: every millimetre before it
 * is cable that nothing protects.
 *
 * Source: 33 CFR 183.455, small craft of the United States (second-hand copy); local codes go
 * first.
 *
 * @param run - millimetres of cable from the source to the device.
 * @throws {OutOfRange} when the distance is negative or over 100 m.
 * @example deviceInReach({ distanceMm: 300, sheathed: false }) // { inReach: false, mostMm: 177.8 }
 */
export function deviceInReach(run: { distanceMm: number; sheathed: boolean }): {
  inReach: boolean;
  mostMm: number;
} {
  const distanceMm = within(run.distanceMm, {
    what: 'Distance',
    unit: 'mm',
    least: 0,
    most: 100_000,
    remedy: 'measure along the cable from the source',
  });
  const mostMm = run.sheathed ? REACH_MM.sheathed : REACH_MM.bare;
  return { inReach: distanceMm <= mostMm, mostMm };
}
