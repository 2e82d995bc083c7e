import { createHash } from 'node:crypto';
import { strandsFromDigest } from './strand-mark.ts';

/**
 * The strand mark of a certificate number: 37 of 0 (ring), 1 (ring with dot) or 2 (solid), row by
 * row. An aid to the eye, never the proof.
 *
 * @param number - as it is printed, with its dashes.
 */
export function strandPattern(number: string): number[] {
  return strandsFromDigest(createHash('sha256').update(number).digest());
}
