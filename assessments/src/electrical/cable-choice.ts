import { sizeForCurrent } from './ampacity.ts';
import { type PracticeProfile } from './practice-profile.ts';
import { sizeForDrop } from './voltage-drop.ts';

/** What a run asks of its cable. */
export interface CableJob {
  amps: number;
  jacketC: number;
  /** Product of the route's conditions. */
  factor: number;
  /** One way, m. */
  lengthM: number;
  limitV: number;
}

/** The cable of a run, by its copper in mm², and which rule decided. */
export interface CableChoice {
  byCurrentMm2: number;
  byDropMm2: number;
  takesMm2: number;
  decidedBy: 'current' | 'drop' | 'both';
}

/**
 * Cable of a run: by what it must carry, then by what it may lose, and the larger of the two.
 *
 * Source: common practice, no source; the tables are those of sizeForCurrent and sizeForDrop.
 *
 * @throws {OutOfRange} when no stock cable does either.
 * @example chooseCable({ amps: 20, jacketC: 105, factor: 1, lengthM: 5, limitV: 0.36 }, PROFILES.metric)
 */
export function chooseCable(job: CableJob, profile: PracticeProfile): CableChoice {
  const byCurrentMm2 = sizeForCurrent(job, profile);
  const byDropMm2 = sizeForDrop(job, profile);
  const takesMm2 = Math.max(byCurrentMm2, byDropMm2);
  if (byCurrentMm2 === byDropMm2) return { byCurrentMm2, byDropMm2, takesMm2, decidedBy: 'both' };
  const decidedBy = byCurrentMm2 > byDropMm2 ? 'current' : 'drop';
  return { byCurrentMm2, byDropMm2, takesMm2, decidedBy };
}

/**
 * Whether a conductor is stout enough to be wired at all, whatever its load: a thin one breaks.
 *
 * Source: ISO 10133:2012 clause 7; 33 CFR 183.425(d) and (e) (both second-hand copies).
 *
 * @param cable - copper in mm², and whether a sheath holds it with others.
 * @example stoutEnough({ areaMm2: 0.75, sheathed: false }, PROFILES.metric) // false
 */
export function stoutEnough(
  cable: { areaMm2: number; sheathed: boolean },
  profile: Pick<PracticeProfile, 'smallestAreasMm2'>,
): boolean {
  const { alone, sheathed } = profile.smallestAreasMm2;
  return cable.areaMm2 >= (cable.sheathed ? sheathed : alone) * (1 - 1e-9);
}
