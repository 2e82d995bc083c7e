import { OutOfRange, within } from './out-of-range.ts';

/** What limits a short circuit between battery and fault. */
export interface FaultPath {
  /** Open-circuit voltage, V. */
  openV: number;
  batteryOhms: number;
  /** Cable out and back, Ω. */
  cableOhms: number;
  /** Fuse, holder, lugs and bonds on the way, Ω. */
  jointOhms: number;
}

const OPEN = {
  what: 'Open-circuit voltage',
  unit: 'V',
  least: 0.1,
  most: 1000,
  remedy: 'take it rested and full: the fault does not wait for a flat battery',
};
const OHMS = { what: 'Resistance', unit: 'Ω', least: 0, most: 100, remedy: 'give ohms' };

/** Most that can flow is what the least resistance lets through: cold cable, full battery. */
const LEAST_LOOP_OHMS = 1e-5;

/**
 * Prospective short-circuit current, A: what the battery drives through itself, the cable there
 * and back and the joints. The fault itself is taken as none.
 *
 * Source: Ohm's law; taking cable at 20 °C and a full battery is common practice, no source.
 *
 * @throws {OutOfRange} when the loop has no resistance, or a figure is out of range.
 * @example prospectiveAmps({ openV: 12.8, batteryOhms: 0.01, cableOhms: 0.033, jointOhms: 0.002 })
 */
export function prospectiveAmps(path: FaultPath): number {
  within(path.openV, OPEN);
  const parts = [path.batteryOhms, path.cableOhms, path.jointOhms];
  const ohms = parts.reduce((sum, part) => sum + within(part, OHMS), 0);
  if (ohms >= LEAST_LOOP_OHMS) return path.openV / ohms;
  throw new OutOfRange(
    `A fault loop of ${ohms} Ω is outside at least ${LEAST_LOOP_OHMS} Ω; give the battery’s own resistance.`,
  );
}

/**
 * Whether a device can break a fault, and what it has to spare, A. A device asked to break more
 * than its breaking capacity may burst and keep the arc. The capacity holds for the voltage it is
 * printed for, DC.
 *
 * Source: definition of breaking capacity, IEC 60269 (from memory).
 *
 * @throws {OutOfRange} when capacity or fault is not above 0.
 * @example canBreak({ breakingA: 1000, prospectiveA: 2350 }) // { breaks: false, spareA: -1350 }
 */
export function canBreak(device: { breakingA: number; prospectiveA: number }): {
  breaks: boolean;
  spareA: number;
} {
  const bounds = { unit: 'A', least: 1e-3, most: 1e6, remedy: 'give amperes' };
  const breakingA = within(device.breakingA, { ...bounds, what: 'Breaking capacity' });
  const prospectiveA = within(device.prospectiveA, { ...bounds, what: 'Fault current' });
  return { breaks: breakingA >= prospectiveA, spareA: breakingA - prospectiveA };
}
