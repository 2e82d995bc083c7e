/** No 0, 1, I or O: nothing that is mistaken for another on paper or on the telephone. */
const alphabet = '23456789ABCDEFGHJKLMNPQRSTUVWXYZ';
const prefix = 'HQ';
const length = 12;
const freeCharacters = length - prefix.length - 1;

// A weighted sum modulo a prime above the alphabet's size: because every weight is different and
// none is zero, no single wrong character and no swap of two characters leaves the sum at zero.
// Any such weights would do; with these the specimen numbers in texts and pictures are well formed.
const modulus = 37;
const weights = [2, 3, 4, 31, 24, 12, 10, 34, 22, 28, 6, 1];

function weightedSum(characters: string): number {
  return [...characters].reduce(
    (sum, character, place) =>
      (sum + (weights[place] ?? 0) * alphabet.indexOf(character)) % modulus,
    0,
  );
}

function grouped(characters: string): string {
  return [characters.slice(0, 4), characters.slice(4, 8), characters.slice(8)].join('-');
}

/**
 * A fresh certificate number. Its last character is a check character.
 *
 * @param randomBytes - at least 9 bytes from a cryptographic source; five bits of each are used.
 * @throws {RangeError} when there are fewer.
 * @example newCertificateNumber(new Uint8Array(9)) // 'HQ22-2222-222H'
 */
export function newCertificateNumber(randomBytes: Uint8Array): string {
  if (randomBytes.length < freeCharacters) {
    throw new RangeError(
      `A certificate number needs ${freeCharacters} random bytes; ${randomBytes.length} were given.`,
    );
  }
  const values = [...randomBytes.slice(0, freeCharacters)].map((byte) => byte % alphabet.length);
  const lastPlace = freeCharacters - 1;
  for (let step = 0; step < alphabet.length; step += 1) {
    const free = values.map((value, place) =>
      alphabet.charAt(place === lastPlace ? (value + step) % alphabet.length : value),
    );
    const start = prefix + free.join('');
    // Five of the 37 remainders have no character: then the last free character moves on by one.
    const check = alphabet.charAt((modulus - weightedSum(start)) % modulus);
    if (check !== '') return grouped(start + check);
  }
  throw new RangeError('No check character was found.');
}

/**
 * Reads a typed certificate number, whatever its case, spaces and dashes.
 *
 * @returns the number as it is printed, or what is wrong with it in words for the person typing.
 * @example readCertificateNumber('hq7k 2m4t 9xwd') // { ok: true, number: 'HQ7K-2M4T-9XWD' }
 */
export function readCertificateNumber(
  typed: string,
): { ok: true; number: string } | { ok: false; reason: string } {
  const characters = typed
    .slice(0, 200)
    .normalize('NFKC')
    .toUpperCase()
    .replace(/[\s\p{Pd}\u2212\u00AD]/gu, '');
  const reason = faultIn(characters);
  return reason === null ? { ok: true, number: grouped(characters) } : { ok: false, reason };
}

function faultIn(characters: string): string | null {
  if (characters === '') return 'Type the certificate number: it looks like HQ7K-2M4T-9XWD.';
  const strange = [...characters].findIndex((character) => !alphabet.includes(character));
  if (strange >= 0) return strangeCharacter(characters, strange);
  if (!characters.startsWith(prefix)) {
    return `Certificate numbers begin with ${prefix}; this one begins with ${characters.slice(0, 2)}.`;
  }
  if (characters.length !== length) {
    return `A certificate number has ${length} letters and digits; this one has ${characters.length}.`;
  }
  if (weightedSum(characters) !== 0) {
    return 'One character is wrong or two are swapped. Compare it with the certificate, then try again.';
  }
  return null;
}

function strangeCharacter(characters: string, index: number): string {
  const character = [...characters][index] ?? '';
  const place = `character ${index + 1}, “${character}”`;
  return 'IO01'.includes(character)
    ? `Certificate numbers never use the letters O and I or the digits 0 and 1. Check ${place}, then try again.`
    : `Certificate numbers are made of letters and digits only. Check ${place}, then try again.`;
}
