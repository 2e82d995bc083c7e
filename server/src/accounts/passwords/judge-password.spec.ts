import { describe, expect, it } from '@jest/globals';
import { commonPasswords } from './common-passwords.ts';
import { judgePassword } from './judge-password.ts';

const person = {
  givenName: 'Zoë',
  familyName: 'Nguyễn-Łukasiewicz',
  email: 'zoe.nguyen@people.example',
};

describe('the length of a passphrase', () => {
  it.each([
    ['tin kettle ov', 2],
    ['tin kettle ove', 1],
    ['tin kettle over', 0],
    ['', 15],
  ])('of %j is short by %i', (password, lengthShort) => {
    expect(judgePassword(password).lengthShort).toBe(lengthShort);
  });

  it('counts characters as people do, not bytes or code units', () => {
    expect(judgePassword('🔧'.repeat(14)).lengthShort).toBe(1);
  });

  it('has no top here: 256 characters are judged like any', () => {
    const long = Array.from({ length: 64 }, (_, i) => String.fromCodePoint(0x4e00 + i * 37)).join(
      '',
    );
    expect(judgePassword(long.repeat(1)).reason).toBeNull();
  });
});

describe('a common password', () => {
  it('stands in a list of three thousand and more', () => {
    expect(commonPasswords.size).toBeGreaterThanOrEqual(3_000);
  });

  it.each([
    'passwordpassword1',
    'Passw0rdP@ssw0rd!',
    'aaaaaaaaaaaaaaaa',
    'abababababababab',
    '123456789012345',
    '314159265358979',
    'qwertyuiopasdfgh',
    '1qaz2wsx3edc4rfv',
    'abcdefghijklmnop',
    'zyxwvutsrqponmlk',
    'ferruleferrule1',
    'Ferrule-Voltage-12V',
    'harrow quay 2026!!',
    'certificate2026certificate',
    'sunshinesunshine',
    'dragon-monkey-1234',
    'letmeinletmein123',
    'correct horse battery staple',
    'iloveyou iloveyou iloveyou',
    'qwerty123456qwerty',
    'x7!Qx7!Qx7!Qx7!Q',
  ])('such as %j is refused with the reason', (password) => {
    const judged = judgePassword(password);
    expect(judged.common).toBe(true);
    expect(judged.reason).toMatch(/^It (is|follows|says) .*\.$/);
  });

  it.each(['zoe nguyen zoe nguyen', 'zoenguyen2026!!!', 'ZOË-NGUYỄN-ŁUKASIEWICZ-1'])(
    'made of the own name, %j, is refused',
    (password) => {
      expect(judgePassword(password, person).reason).toBe('It is mostly your own name or email.');
    },
  );
});

describe('a passphrase of four ordinary words or many odd signs', () => {
  it.each([
    'tin kettle over harbour',
    'copper lantern seven Tuesdays',
    'Gull eats the blue chips',
    'kJ8#vQ2!mZ5&pL9',
    'zoe likes plum jam on rye',
    'три зелёных чайника у моря',
    'vier kleine enten im regen',
  ])('such as %j is accepted', (password) => {
    expect(judgePassword(password, person)).toEqual({
      lengthShort: 0,
      common: false,
      reason: null,
    });
  });
});

it.each(['qwertyuiop1qaz', 'a1b2c3', 'passworddragon', 'kJ8vQ2mZ5pL9xR'])(
  'judges a thousand characters of %j in a moment',
  (piece) => {
    const before = process.cpuUsage();
    judgePassword(piece.repeat(200).slice(0, 1_024));
    const { user, system } = process.cpuUsage(before);
    expect((user + system) / 1_000).toBeLessThan(1_000);
  },
);
