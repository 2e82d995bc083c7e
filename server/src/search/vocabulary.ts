/** Words of a text as they are looked up: letters and digits, points and hyphens inside. */
export const wordsIn = (text: string): string[] =>
  text
    .normalize('NFKC')
    .toLowerCase()
    .match(/[\p{L}\p{N}]+(?:[.-][\p{L}\p{N}]+)*/gu) ?? [];

const SHORTEST = 4;
const LONGEST = 40;

/** How often each word worth guessing at is used. */
export function countWords(texts: readonly string[]): Map<string, number> {
  const uses = new Map<string, number>();
  for (const word of texts.flatMap(wordsIn)) {
    if (word.length < SHORTEST || word.length > LONGEST || !/^\p{L}+$/u.test(word)) continue;
    uses.set(word, (uses.get(word) ?? 0) + 1);
  }
  return uses;
}

/** How many letters must be changed, left out, put in or exchanged with the next. */
function distance(one: string, other: string): number {
  const isSame = (i: number, j: number) => one[i - 1] === other[j - 1];
  const isSwapped = (i: number, j: number) =>
    one[i - 1] === other[j - 2] && one[i - 2] === other[j - 1];
  let before: number[] = [];
  let last = Array.from({ length: other.length + 1 }, (_, at) => at);
  for (let i = 1; i <= one.length; i += 1) {
    const row = [i];
    for (let j = 1; j <= other.length; j += 1) {
      const kept = at(last, j - 1) + (isSame(i, j) ? 0 : 1);
      const swapped = isSwapped(i, j) ? at(before, j - 2) + 1 : Infinity;
      row.push(Math.min(at(last, j) + 1, at(row, j - 1) + 1, kept, swapped));
    }
    [before, last] = [last, row];
  }
  return at(last, other.length);
}

const at = (row: readonly number[], index: number) => row[index] ?? Infinity;

const LONG_WORD = 8;

const allowedFor = (word: string) => {
  if (word.length < SHORTEST) return 0;
  return word.length < LONG_WORD ? 1 : 2;
};

/** The beginnings of a longer word that a mistyped beginning may stand for. */
const beginningsOf = (known: string, length: number) =>
  known.length <= length + 1 ? [known] : [-1, 0, 1].map((more) => known.slice(0, length + more));

/** How far a known word is from what was typed, of which the end may be missing. */
function awayFrom(known: string, word: string, { isLast }: { isLast: boolean }): number {
  const more = known.length - word.length;
  const allowed = allowedFor(word);
  // Whoever mistypes a word seldom does so at its first letter; the others need not be measured.
  if (known[0] !== word[0] || more < -allowed || (!isLast && more > allowed)) return Infinity;
  const forms = isLast ? beginningsOf(known, word.length) : [known];
  return Math.min(...forms.map((form) => distance(word, form)));
}

/**
 * The word that a mistyped one was most likely meant to be, itself when it is known or none is
 * near.
 *
 * @param isLast - whoever types may not have come to its end.
 */
export function nearestWord(
  word: string,
  vocabulary: ReadonlyMap<string, number>,
  isLast: boolean,
): string {
  const allowed = allowedFor(word);
  if (allowed === 0 || vocabulary.has(word)) return word;
  if (isLast && [...vocabulary.keys()].some((known) => known.startsWith(word))) return word;
  let nearest = { word, away: allowed + 1, uses: 0 };
  for (const [known, uses] of vocabulary) {
    const away = awayFrom(known, word, { isLast });
    const isNearer = away < nearest.away || (away === nearest.away && uses > nearest.uses);
    if (isNearer) nearest = { word: known, away, uses };
  }
  return nearest.away <= allowed ? nearest.word : word;
}
