import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import {
  answersThatCount,
  closingTime,
  handingIn,
  isPastItsTime,
  minutesAllowed,
  newReceipt,
  passMarks,
  percentOf,
  requireWritable,
  type Rules,
  type SavedAnswer,
} from './sitting.ts';
import { SittingClosed, TakenOver } from './sittings.errors.ts';
import { decideStanding, type EarlierSitting } from './standing.ts';

const at = (time: string) => new Date(`2026-12-01T${time}Z`);
const open = { closesAt: at('10:45:00'), handedInAt: null };

describe('the pass mark', () => {
  it('is the least whole mark that reaches the percentage', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 500 }),
        fc.integer({ min: 1, max: 100 }),
        (outOf, per) => {
          const marks = passMarks(outOf, per);
          expect(marks * 100).toBeGreaterThanOrEqual(outOf * per);
          expect((marks - 1) * 100).toBeLessThan(outOf * per);
        },
      ),
    );
  });

  it('is never met by a percentage that was rounded up', () => {
    expect(percentOf(27, 40)).toBe(67);
    expect(percentOf(699, 1000)).toBe(69);
    expect(passMarks(40, 70)).toBe(28);
  });
});

describe('the time of a sitting', () => {
  it('is longer by the extra time that was approved', () => {
    expect(minutesAllowed(90, 25)).toBe(112.5);
    const rules = { minutes: 90, extraTimePercent: 25 } as Rules;
    expect(closingTime(at('10:00:00'), rules)).toEqual(at('11:52:30'));
  });

  it('takes an answer that was on its way for two seconds more', () => {
    expect(isPastItsTime(open, at('10:45:02.000'))).toBe(false);
    expect(isPastItsTime(open, at('10:45:02.001'))).toBe(true);
  });

  it('ends when the candidate hands in, or at the deadline', () => {
    expect(handingIn(open, at('10:30:00'))).toEqual({ at: at('10:30:00'), how: 'by-candidate' });
    expect(handingIn(open, at('10:45:01'))).toEqual({ at: at('10:45:00'), how: 'by-candidate' });
    expect(handingIn(open, at('18:00:00'))).toEqual({ at: at('10:45:00'), how: 'at-the-deadline' });
  });
});

describe('writing', () => {
  it('is for the one session that has the paper', () => {
    const sitting = { handedInAt: null, writingSessionId: 'mine' };
    expect(() => requireWritable(sitting, 'mine')).not.toThrow();
    expect(() => requireWritable(sitting, 'other')).toThrow(TakenOver);
    expect(() => requireWritable({ ...sitting, handedInAt: at('10:30:00') }, 'mine')).toThrow(
      SittingClosed,
    );
  });
});

describe('the answers that count', () => {
  const saved = fc.record({
    itemKey: fc.constantFrom('one', 'two'),
    part: fc.constantFrom('a', 'b'),
    sequence: fc.integer({ min: 1, max: 30 }),
  });

  it('are the highest of each part, in whatever order they came', () => {
    fc.assert(
      fc.property(fc.array(saved, { maxLength: 40 }), (drafts) => {
        const kept = answersThatCount(drafts as SavedAnswer[]);
        for (const { itemKey, part, sequence } of drafts) {
          const counting = kept.get(itemKey)?.get(part)?.sequence ?? 0;
          expect(counting).toBeGreaterThanOrEqual(sequence);
          expect(drafts).toContainEqual({ itemKey, part, sequence: counting });
        }
      }),
    );
  });
});

describe('a receipt', () => {
  it('is short and has nothing that is misheard', () => {
    expect(newReceipt('F1', 7, new Uint8Array([0, 1, 2, 31]))).toBe('F1-234Z-07');
    fc.assert(
      fc.property(fc.uint8Array({ minLength: 8, maxLength: 8 }), (random) => {
        expect(newReceipt('F1', 19, random)).toMatch(/^F1-[2-9A-HJ-NP-Z]{4}-19$/);
      }),
    );
  });
});

describe('where someone stands', () => {
  const now = at('10:00:00');
  const around = { certificateId: null, now, zone: 'Europe/London' };
  const sat = (more: Partial<EarlierSitting>): EarlierSitting => ({
    ...{ id: 's', startedAt: now, handedInAt: now, passed: false, maySitAgainAt: null },
    ...more,
  });

  it.each([
    ['open', [], null],
    ['sitting', [sat({ handedInAt: null, passed: null })], null],
    ['passed', [sat({ passed: true })], 'certificate'],
    ['waiting', [sat({ passed: null })], null],
    ['waiting', [sat({ maySitAgainAt: at('10:00:01') })], null],
    ['open', [sat({ maySitAgainAt: now })], null],
    ['waiting', [sat({}), sat({ maySitAgainAt: at('23:00:00') })], null],
  ] as const)('is %s', (state, sittings, certificateId) => {
    expect(decideStanding({ ...around, sittings, certificateId }).state).toBe(state);
  });

  it('is told with the day in the zone of the scheme', () => {
    const maySitAgainAt = new Date('2027-06-30T23:00:00Z');
    const standing = decideStanding({ ...around, sittings: [sat({ maySitAgainAt })] });
    expect(standing.reasons).toEqual(['You may sit again from 1 July 2027.']);
  });
});
