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
