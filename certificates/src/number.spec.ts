import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { newCertificateNumber, readCertificateNumber } from './number.ts';

const alphabet = '23456789ABCDEFGHJKLMNPQRSTUVWXYZ';
const numbers = fc.uint8Array({ minLength: 16, maxLength: 16 }).map(newCertificateNumber);
const reasonFor = (typed: string): string => {
  const reading = readCertificateNumber(typed);
  return reading.ok ? 'it is well formed' : reading.reason;
};
/** Places of the free and check characters; the dashes stand between. */
const places = [0, 1, 2, 3, 5, 6, 7, 8, 10, 11, 12, 13];

describe('certificate numbers', () => {
  it('are drawn in the form that is printed and read back as they are', () => {
    fc.assert(
      fc.property(numbers, (number) => {
        expect(number).toMatch(/^HQ[2-9A-HJ-NP-Z]{2}(-[2-9A-HJ-NP-Z]{4}){2}$/);
        expect(readCertificateNumber(number)).toEqual({ ok: true, number });
      }),
    );
    expect(newCertificateNumber(new Uint8Array(9))).toBe('HQ22-2222-222H');
  });

  it('differ whenever the random bytes differ in one free character but the last', () => {
    const drawn = Array.from({ length: 32 }, (_, value) =>
      newCertificateNumber(Uint8Array.of(value, 7, 7, 7, 7, 7, 7, 7, 7)),
    );
    expect(new Set(drawn).size).toBe(32);
  });

  it('are not drawn from too few random bytes', () => {
    expect(() => newCertificateNumber(new Uint8Array(8))).toThrow('needs 9 random bytes; 8 were');
  });

  it('betray any single wrong character', () => {
    fc.assert(
      fc.property(
        numbers,
        fc.constantFrom(...places),
        fc.constantFrom(...alphabet),
        (number, place, wrong) => {
          fc.pre(number[place] !== wrong);
          const mistyped = number.slice(0, place) + wrong + number.slice(place + 1);
          expect(readCertificateNumber(mistyped).ok).toBe(false);
        },
      ),
      { numRuns: 2000 },
    );
  });

  it('betray any two characters swapped, next to each other or not', () => {
    fc.assert(
      fc.property(
        numbers,
        fc.constantFrom(...places),
        fc.constantFrom(...places),
        (number, one, other) => {
          const characters = [...number];
          [characters[one], characters[other]] = [characters[other] ?? '', characters[one] ?? ''];
          fc.pre(characters.join('') !== number);
          expect(readCertificateNumber(characters.join('')).ok).toBe(false);
        },
      ),
      { numRuns: 2000 },
    );
  });

  it.each([
    'hq7k2m4t9xwd',
    ' HQ7K 2M4T 9XWD ',
    'Hq7k–2m4t—9xwd',
    'ＨＱ７Ｋ-2M4T-9XWD',
    'HQ7K\t2M4T−9XWD',
  ])('are read however they are typed: %s', (typed) => {
    expect(readCertificateNumber(typed)).toEqual({ ok: true, number: 'HQ7K-2M4T-9XWD' });
  });

  it('say what is wrong with a typed one', () => {
    expect(reasonFor('HQ7K-2M4T-9XWO')).toBe(
      'Certificate numbers never use the letters O and I or the digits 0 and 1. Check character 12, “O”, then try again.',
    );
    expect(reasonFor('HQ7K-2M4T-9XW')).toContain('12 letters and digits; this one has 11');
    expect(reasonFor('AB7K-2M4T-9XWD')).toContain('begin with HQ; this one begins with AB');
    expect(reasonFor('HQ7K-2M4T-9X?D')).toContain('Check character 11, “?”');
    expect(reasonFor('HQ7K-2M4T-9XDW')).toContain('One character is wrong or two are swapped');
    expect(reasonFor('  ')).toContain('Type the certificate number');
    expect(reasonFor('😀'.repeat(100_000))).toContain('letters and digits only');
  });
});
