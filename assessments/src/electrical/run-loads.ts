import { OutOfRange, within } from './out-of-range.ts';

/** A load on a run: how far it is beyond the one before, and what it takes. */
export interface Tap {
  beyondM: number;
  amps: number;
}

/** What stands at a tap. */
export interface AtTap {
  /** From the source, m. */
  distanceM: number;
  /** In the section that ends here: this load and all beyond it, A. */
  sectionAmps: number;
  /** Lost out and back from the source to here, V. */
  dropV: number;
}

const LENGTH = { what: 'Section', unit: 'm', least: 0, most: 1000, remedy: 'give metres one way' };
const LOAD = { what: 'Current', unit: 'A', least: 0, most: 2000, remedy: 'give amperes' };
const OHMS_KM = {
  what: 'Resistance',
  unit: 'Ω/km',
  least: 0,
  most: 1000,
  remedy: 'give one conductor, 0 for a return that loses nothing',
};

/**
 * Drop at every load along one run; each section carries all the loads beyond it. Loads take
 * constant currents.
 *
 * Source: Kirchhoff's laws.
 *
 * @param run - Ω/km of the conductor out, and of the way back: the same again for a pair, near
 * nought for a chassis.
 * @throws {OutOfRange} when there is no load, or a figure out of the trade's range.
 * @example dropsAlongRun({ outOhmsPerKm: 3.3, backOhmsPerKm: 3.3 }, [{ beyondM: 2, amps: 5 }])
 */
export function dropsAlongRun(
  run: { outOhmsPerKm: number; backOhmsPerKm: number },
  taps: readonly Tap[],
): AtTap[] {
  if (taps.length === 0) throw new OutOfRange('A run with no load has no drop; give a load.');
  const ohmsPerKm = within(run.outOhmsPerKm, OHMS_KM) + within(run.backOhmsPerKm, OHMS_KM);
  let distanceM = 0;
  let dropV = 0;
  let sectionAmps = taps.reduce((sum, { amps }) => sum + within(amps, LOAD), 0);
  return taps.map(({ beyondM, amps }) => {
    distanceM += within(beyondM, LENGTH);
    dropV += (beyondM * ohmsPerKm * sectionAmps) / 1000;
    const here = { distanceM, sectionAmps, dropV };
    // Rounding may leave the last section a hair under nought.
    sectionAmps = Math.max(0, sectionAmps - amps);
    return here;
  });
}

/** A circuit with a feed of its own into a return it shares. */
export interface Feed {
  feedOhms: number;
  amps: number;
}

/**
 * Drops of circuits that share one return: each loses its own feed's volts and the return's, and
 * the return carries them all. One heavy load dims the others.
 *
 * Source: Kirchhoff's laws.
 *
 * @throws {OutOfRange} when there is no feed, or a figure out of the trade's range.
 * @example sharedReturnDrops(0.01, [{ feedOhms: 0.02, amps: 5 }, { feedOhms: 0.05, amps: 30 }])
 */
export function sharedReturnDrops(
  returnOhms: number,
  feeds: readonly Feed[],
): { ownV: number; sharedV: number; dropV: number }[] {
  if (feeds.length === 0) throw new OutOfRange('A return with no feed has no drop; give a feed.');
  const amps = feeds.reduce((sum, feed) => sum + within(feed.amps, LOAD), 0);
  const sharedV = amps * within(returnOhms, OHMS);
  return feeds.map((feed) => {
    const ownV = feed.amps * within(feed.feedOhms, OHMS);
    return { ownV, sharedV, dropV: ownV + sharedV };
  });
}

const OHMS = { what: 'Resistance', unit: 'Ω', least: 0, most: 1000, remedy: 'give ohms' };
