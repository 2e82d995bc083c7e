import { describe, expect, it } from 'vitest';
import { fonts } from '../../test/fixtures.ts';
import { checkHolderName } from './holder-name.ts';

describe('a name its holder confirms', () => {
  it.each([
    ['Zoë Nguyễn-Łukasiewicz', 'Zoë Nguyễn-Łukasiewicz'],
    ['  Ema  ', 'Ema'],
    ['Ελένη', 'Ελένη'],
    // Their space comes last in the cut font.
    ['Ifeoma Castellano', 'Ifeoma Castellano'],
    ['Gwilym Asante', 'Gwilym Asante'],
    ['Tawhiri'.replace('a', 'a\u0304'), 'Tāwhiri'],
  ])('is taken as it will be printed: %s', async (typed, name) => {
    expect(await checkHolderName(typed, fonts)).toEqual({ ok: true, name });
  });

  it.each([
    ['王', 'no letter for “王”'],
    [' ', 'is empty'],
    ['Ada\u0000', 'invisible character U+0000'],
    ['Abcdefghijklmnop'.repeat(8), 'is too long for the certificate'],
  ])('is refused before the paper is sat when it cannot be printed: %s', async (typed, words) => {
    expect(await checkHolderName(typed, fonts)).toMatchObject({
      ok: false,
      reason: expect.stringContaining(words) as string,
    });
  });
});
