import { plainCore, readAsParts, type Part } from './guessable-parts.ts';

/** Fifteen where the password is the only factor (NIST SP 800-63B-4, 3.1.1.2). */
const LEAST_CHARACTERS = 15;
const FEWEST_DIFFERENT = 5;
/** More is not looked at: nobody has a passphrase that is common only so far in. */
const MOST_JUDGED = 256;
/** A password worth less than this many words is among the first a program tries. */
const LEAST_WORTH = 3;

export interface PasswordJudgement {
  /** How many characters are missing. */
  readonly lengthShort: number;
  readonly common: boolean;
  /** Why it was refused, or null. */
  readonly reason: string | null;
}

/** What a stranger may know of the person. */
export interface KnownOfPerson {
  readonly givenName: string;
  readonly familyName: string;
  readonly email: string;
}

function ownWords(person: KnownOfPerson | null): ReadonlySet<string> {
  if (!person) return new Set();
  const said = [person.givenName, person.familyName, person.email.split('@').join(' ')];
  const words = said.flatMap((text) => [
    plainCore(text),
    ...text.split(/[^\p{L}\p{N}\p{M}]+/u).map(plainCore),
  ]);
  return new Set(words.filter((word) => word.length >= 3));
}

/** Whether the text is one piece said again and again, the last time perhaps not to its end. */
function repeats(core: string): boolean {
  for (let period = 1; period <= core.length / 2; period += 1) {
    if (core.slice(period) === core.slice(0, -period)) return true;
  }
  return false;
}

function reasonFrom(parts: Part[]): string {
  const kinds = new Set(parts.map(({ kind }) => kind));
  if (kinds.has('own')) return 'It is mostly your own name or email.';
  if (kinds.has('context')) return 'It is mostly a word that everyone would try here first.';
  if (kinds.has('word')) {
    return 'It is one or two words that many people use. Four or five words will do it.';
  }
  return 'It follows the keyboard or the alphabet.';
}

function whyCommon(core: string, person: KnownOfPerson | null): string | null {
  if (new Set(core).size < FEWEST_DIFFERENT)
    return 'It is the same few characters again and again.';
  if (/^\p{N}+$/u.test(core)) return 'It is figures only: dates and numbers are tried first.';
  const parts = readAsParts(core, ownWords(person));
  const worth = parts.reduce((sum, part) => sum + part.worth, 0);
  if (worth < LEAST_WORTH) return reasonFrom(parts);
  return repeats(core) ? 'It says the same thing more than once.' : null;
}

/**
 * Whether a passphrase is long enough and not among those tried first. No rules about capitals,
 * figures or signs: they make passwords harder to keep in mind and no harder to guess.
 */
export function judgePassword(
  password: string,
  person: KnownOfPerson | null = null,
): PasswordJudgement {
  const length = [...password.normalize('NFKC')].length;
  const reason = whyCommon(plainCore(password).slice(0, MOST_JUDGED), person);
  return {
    lengthShort: Math.max(0, LEAST_CHARACTERS - length),
    common: reason !== null,
    reason,
  };
}
