// Letters that Unicode does not take apart into a base letter and a mark.
const wholeLetters: Readonly<Record<string, string>> = {
  ß: 'ss',
  æ: 'ae',
  œ: 'oe',
  ø: 'o',
  đ: 'd',
  ð: 'd',
  ł: 'l',
  þ: 'th',
  ħ: 'h',
  ı: 'i',
  ŋ: 'n',
  ŧ: 't',
  ƒ: 'f',
  ĸ: 'k',
};

// Small words people leave out or add when they write a family name.
const particles = new Set(
  (
    'af al ap av bin bint da dal das de degli dei del della den der des di do dos du e el ferch ' +
    'ibn la las le los of op san te ten ter thoe und v van vande vanden vander vom von vor y zu zum zur'
  ).split(' '),
);

const latinMarks = /[\u0300-\u036F\u1AB0-\u1AFF\u1DC0-\u1DFF]/g;
const apostrophes = /['’‘ʼʻ`´ʹ＇]/g;

/**
 * A name reduced to what must agree when two people write it: case, accents, apostrophes, spaces,
 * hyphens and particles (van, de, of …) do not count. Fold both sides and compare.
 *
 * @returns an empty string only for a name without letters or digits.
 * @example foldName('van der Meer') === foldName('MEER') // true
 * @example foldName('Nguyễn-Łukasiewicz') // 'nguyenlukasiewicz'
 */
export function foldName(name: string): string {
  const words = name
    .replace(apostrophes, '')
    .normalize('NFKD')
    .toLowerCase()
    .replace(latinMarks, '')
    .replace(apostrophes, '')
    .replace(/[^\p{L}\p{N}\p{M}]/gu, ' ')
    .replace(/./gu, (letter) => wholeLetters[letter] ?? letter)
    .split(' ')
    .filter((word) => word !== '');
  const weighty = words.filter((word) => !particles.has(word));
  // Le, Van and Do are also whole family names.
  return (weighty.length > 0 ? weighty : words).join('');
}
