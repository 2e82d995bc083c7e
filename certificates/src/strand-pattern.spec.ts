import { describe, expect, it } from 'vitest';
import { strandCentres } from './strand-mark.ts';
import { strandPattern } from './strand-pattern.ts';
import { strandPatternOf } from './verify.ts';

describe('the strand mark', () => {
  it('takes two bits a strand from the SHA-256 of the number', () => {
    // FIPS 180-4, example "abc": ba7816bf 8f01cfea …, low half of each byte first.
    expect(strandPattern('abc').slice(0, 12)).toEqual([2, 2, 0, 2, 2, 1, 2, 2, 2, 0, 1, 0]);
    expect(strandPattern('abc')).toHaveLength(37);
  });

  it('is the same in the browser', async () => {
    expect(await strandPatternOf('HQ7K-2M4T-9XWD')).toEqual(strandPattern('HQ7K-2M4T-9XWD'));
  });

  it('lays 37 strands one diameter apart within three diameters of the middle', () => {
    const centres = strandCentres();
    expect(centres).toHaveLength(37);
    for (const [index, one] of centres.entries()) {
      expect(Math.hypot(one.x, one.y)).toBeLessThan(3.0001);
      const nearest = centres
        .filter((_, other) => other !== index)
        .map((other) => Math.hypot(one.x - other.x, one.y - other.y));
      expect(Math.min(...nearest)).toBeCloseTo(1, 6);
    }
  });
});
