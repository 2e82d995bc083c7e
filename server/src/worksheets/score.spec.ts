import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { bestOf, isLit, percentOf } from './score.ts';

const handed = (marks: number, outOf: number, day: number) => ({
  ...{ marks, outOf },
  handedInAt: new Date(Date.UTC(2026, 11, day)),
});

describe('a score', () => {
  it('never reads as the pass mark when it is under it', () => {
    expect(percentOf(799, 1_000)).toBe(79);
    expect(isLit({ percent: percentOf(799, 1_000) }, 80)).toBe(false);
    expect(percentOf(4, 5)).toBe(80);
  });

  it('lights the lamp exactly when the marks reach the share asked for', () => {
    fc.assert(
      fc.property(
        fc
          .integer({ min: 1, max: 200 })
          .chain((outOf) => fc.tuple(fc.integer({ min: 0, max: outOf }), fc.constant(outOf))),
        fc.integer({ min: 1, max: 100 }),
        ([marks, outOf], pass) => {
          expect(isLit({ percent: percentOf(marks, outOf) }, pass)).toBe(
            marks * 100 >= pass * outOf,
          );
        },
      ),
    );
  });

  it('is the best handed in, and the first of equals', () => {
    const open = { marks: null, outOf: 10, handedInAt: null };
    const best = bestOf([handed(6, 10, 1), handed(9, 10, 2), open, handed(9, 10, 3)]);
    expect(best).toEqual({ marks: 9, outOf: 10, percent: 90, on: new Date('2026-12-02') });
    expect(bestOf([open])).toBeNull();
  });
});
