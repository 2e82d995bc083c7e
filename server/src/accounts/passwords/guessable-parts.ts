import { commonPasswords } from './common-passwords.ts';

/** What a cracking program tries first, besides words: rows of the keyboard, the alphabet, figures. */
const LINES = [
  'abcdefghijklmnopqrstuvwxyz',
  '01234567890',
  'qwertyuiop',
  'qwertzuiop',
  'azertyuiop',
  'asdfghjkl',
  'zxcvbnm',
  '1qaz2wsx3edc4rfv5tgb6yhn7ujm8ik9ol0p',
  'qazwsxedcrfvtgbyhnujmikolp',
  '1q2w3e4r5t6y7u8i9o0p',
  'q1w2e3r4t5y6u7i8o9p0',
  'a1b2c3d4e5f6g7h8i9j0',
];
const walks = LINES.flatMap((line) => [line, [...line].reverse().join('')]);

/** Words of this product, its trade and its school: a stranger would try them here first. */
const CONTEXT = [
  'ferrule',
  'harrow',
  'quay',
  'harrowquay',
  'ropewalk',
  'technical',
  'school',
  'college',
  'auxiliary',
  'system',
  'systems',
  'installer',
  'installation',
  'hqdc2',
  'course',
  'lesson',
  'worksheet',
  'paper',
  'certificate',
  'register',
  'electric',
  'electrical',
  'electrician',
  'voltage',
  'volt',
  'volts',
  'ampere',
  'amp',
  'amps',
  'current',
  'battery',
  'batteries',
  'charger',
  'charging',
  'cable',
  'fuse',
  'circuit',
  'wiring',
  'wire',
  'solar',
  'alternator',
  'inverter',
  'lithium',
  'absorption',
  'float',
  'bulk',
  'password',
  'passphrase',
  'passwort',
];
const contextWords: ReadonlySet<string> = new Set(CONTEXT);

const LEET: Readonly<Record<string, string>> = {
  '0': 'o',
  '1': 'i',
  '3': 'e',
  '4': 'a',
  '5': 's',
  '7': 't',
  '@': 'a',
  $: 's',
  '!': 'i',
};
const LONGEST_WORD = 26;
const SHORTEST_WALK = 3;

export type PartKind = 'own' | 'context' | 'word' | 'again' | 'walk' | 'year' | 'other';

/** A stretch of a password, and how many guesses' worth it adds (an ordinary word is 1). */
export interface Part {
  readonly kind: PartKind;
  readonly text: string;
  readonly worth: number;
}

/** Letters and figures in lower case; signs and spaces hide nothing from a cracking program. */
export const plainCore = (password: string): string =>
  password
    .normalize('NFKD')
    .toLowerCase()
    .replaceAll(/[^\p{L}\p{N}@$!]/gu, '');

const unleet = (text: string) => [...text].map((sign) => LEET[sign] ?? sign).join('');

function walkLength(text: string, from: number): number {
  let longest = 1;
  while (text[from + longest] === text[from] && from + longest < text.length) longest += 1;
  for (const walk of walks) {
    let length = longest;
    while (from + length < text.length && walk.includes(text.slice(from, from + length + 1))) {
      length += 1;
    }
    if (walk.includes(text.slice(from, from + length))) longest = Math.max(longest, length);
  }
  return longest;
}

function wordKind(text: string, own: ReadonlySet<string>): 'own' | 'context' | 'word' | null {
  const plain = unleet(text);
  if (own.has(text) || own.has(plain)) return 'own';
  if (contextWords.has(text) || contextWords.has(plain)) return 'context';
  return commonPasswords.has(text) || commonPasswords.has(plain) ? 'word' : null;
}

const WORTH = { own: 0, context: 0, word: 1, again: 0, walk: 0.5, year: 0.5, other: 0.5 } as const;

function partAt(text: string, from: number, to: number, own: ReadonlySet<string>): Part | null {
  const piece = text.slice(from, to);
  const kind = wordKind(piece, own);
  if (kind) return { kind, text: piece, worth: WORTH[kind] };
  if (/^(19|20)\d\d$/.test(piece)) return { kind: 'year', text: piece, worth: WORTH.year };
  return null;
}

/**
 * The cheapest way to read a password as words, walks, years and single signs: what a program
 * would do that knows the person's name and what this product is about.
 */
export function readAsParts(core: string, own: ReadonlySet<string>): Part[] {
  const best: Array<{ worth: number; parts: Part[] }> = [{ worth: 0, parts: [] }];
  const offer = (to: number, worth: number, parts: Part[]) => {
    const standing = best[to];
    if (!standing || worth < standing.worth) best[to] = { worth, parts };
  };
  for (let from = 0; from < core.length; from += 1) {
    const reached = best[from];
    if (!reached) continue;
    const extend = (to: number, part: Part) => {
      const seen = part.kind === 'word' && reached.parts.some(({ text }) => text === part.text);
      const added = seen ? { ...part, kind: 'again' as const, worth: WORTH.again } : part;
      offer(to, reached.worth + added.worth, [...reached.parts, added]);
    };
    extend(from + 1, { kind: 'other', text: core.slice(from, from + 1), worth: WORTH.other });
    const walk = walkLength(core, from);
    for (let length = SHORTEST_WALK; length <= walk; length += 1) {
      extend(from + length, {
        kind: 'walk',
        text: core.slice(from, from + length),
        worth: WORTH.walk,
      });
    }
    for (let to = from + 3; to <= Math.min(core.length, from + LONGEST_WORD); to += 1) {
      const part = partAt(core, from, to, own);
      if (part) extend(to, part);
    }
  }
  return best[core.length]?.parts ?? [];
}
