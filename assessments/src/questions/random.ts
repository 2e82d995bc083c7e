/** A stream of numbers settled by its seed alone. */
export interface Draws {
  /** At least 0, below 1. */
  share(): number;
  /** A whole number, 0 to count − 1. */
  below(count: number): number;
  /** The same things in a new order. */
  shuffled<T>(things: readonly T[]): T[];
  /** An opaque mark of letters and digits, its own kind of random. */
  mark(): string;
}

const LEAST_HEX_DIGITS = 32;

/**
 * Starts a stream from the hex of a keyed hash (small fast counting generator, 128-bit state).
 *
 * @throws {Error} when the seed is not at least 32 hex digits.
 */
export function drawsFrom(seed: string): Draws {
  if (!/^[0-9a-f]+$/i.test(seed) || seed.length < LEAST_HEX_DIGITS) {
    throw new Error(
      `Seed of ${seed.length} characters is not a keyed hash in hex; give at least ${LEAST_HEX_DIGITS} hex digits.`,
    );
  }
  const next = generator(foldSeed(seed));
  const share = (): number => next() / 4294967296;
  const below = (count: number): number => Math.floor(share() * count);
  return { share, below, shuffled: (things) => shuffle(things, below), mark: () => mark(below) };
}

/** Longer seeds are folded, so that every digit counts. */
function foldSeed(seed: string): [number, number, number, number] {
  const words: [number, number, number, number] = [0, 0, 0, 0];
  for (let at = 0; at < seed.length; at += 8) {
    const slot = (at / 8) % 4;
    const word = parseInt(seed.slice(at, at + 8), 16) >>> 0;
    const mixed = Math.imul((words[slot] ?? 0) ^ word, 0x9e3779b1);
    // Shifting down spreads high digits too: a product alone only carries upwards.
    words[slot] = (mixed ^ (mixed >>> 15)) >>> 0;
  }
  return words;
}

function generator(seed: [number, number, number, number]): () => number {
  let [a, b, c, counter] = seed;
  const next = (): number => {
    const sum = (((a + b) | 0) + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (c << 21) | (c >>> 11);
    c = (c + sum) | 0;
    return sum >>> 0;
  };
  for (let warm = 0; warm < 15; warm += 1) next();
  return next;
}

function shuffle<T>(things: readonly T[], below: (count: number) => number): T[] {
  const pile = [...things];
  const order: T[] = [];
  while (pile.length > 0) order.push(...pile.splice(below(pile.length), 1));
  return order;
}

const MARK_LETTERS = '23456789abcdefghjkmnpqrstuvwxyz';

function mark(below: (count: number) => number): string {
  let letters = '';
  while (letters.length < 8) letters += MARK_LETTERS.charAt(below(MARK_LETTERS.length));
  return letters;
}

/** So many marks, no two alike. */
export function opaqueIds(count: number, draws: Draws): string[] {
  const found = new Set<string>();
  while (found.size < count) found.add(draws.mark());
  return [...found];
}
