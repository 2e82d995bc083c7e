import { OutOfRange, within } from './out-of-range.ts';

/** One piece of a circuit that the whole current passes: a cable, a joint, a fuse, the load. */
export interface PathPart {
  is: string;
  ohms: number;
}

/** What a tester finds across a piece under load. */
export interface PathDrop extends PathPart {
  volts: number;
  watts: number;
}

const EMF = {
  what: 'Voltage',
  unit: 'V',
  least: 0,
  most: 1000,
  remedy: 'give the source’s open-circuit voltage',
};
const OHMS = {
  what: 'Resistance',
  unit: 'Ω',
  least: 0,
  most: 1e9,
  remedy: 'give ohms; a joint of 2 mΩ is 0.002',
};

/**
 * Current of one loop and the volts and heat of each piece in it, the source's own resistance
 * and every joint being pieces too.
 *
 * Source: Ohm's and Kirchhoff's laws.
 *
 * @throws {OutOfRange} when the loop has no resistance, or a figure is out of range.
 * @example seriesPath(12.8, [{ is: 'cable', ohms: 0.033 }, { is: 'lamp', ohms: 1.2 }]).amps
 */
export function seriesPath(
  emfV: number,
  parts: readonly PathPart[],
): { amps: number; drops: PathDrop[] } {
  within(emfV, EMF);
  const ohms = parts.reduce((sum, part) => sum + within(part.ohms, OHMS), 0);
  if (ohms < 1e-6) {
    throw new OutOfRange(
      `A loop of ${ohms} Ω has no current that could be told; give the battery’s own resistance.`,
    );
  }
  const amps = emfV / ohms;
  const drops = parts.map((part) => ({
    ...part,
    volts: amps * part.ohms,
    watts: amps ** 2 * part.ohms,
  }));
  return { amps, drops };
}
