/** Marks that are not seen: zero-width spaces and joiners, direction marks, soft hyphens. */
const UNSEEN = /[\u00ad\u200b-\u200f\u202a-\u202e\u2060\u2066-\u2069\ufeff]/g;
/** Hyphens, dashes and minus signs: − – — and their like. */
const DASHES = /[\u2010-\u2015\u2212\ufe58\ufe63\uff0d]/g;
/** The ASCII signs in the width of East Asian letters. */
const FULL_WIDTH = /[\uff01-\uff5e]/g;
const FULL_WIDTH_SHIFT = 0xfee0;

/** Signs that look or mean the same made one: every space a space, every minus a hyphen. */
export function plainSigns(text: string): string {
  if (/^[\x20-\x7e]*$/.test(text)) return text.trim();
  return text
    .replace(UNSEEN, '')
    .replace(DASHES, '-')
    .replace(FULL_WIDTH, (sign) => String.fromCharCode(sign.charCodeAt(0) - FULL_WIDTH_SHIFT))
    .replace(/\s/g, ' ')
    .trim();
}
