import { type TermView } from './queries.ts';

export interface Letter {
  letter: string;
  terms: TermView[];
}

/** Terms under their first letter, in the order they came; what is no letter stands under "#". */
export function byLetter(terms: readonly TermView[]): Letter[] {
  const letters = new Map<string, TermView[]>();
  for (const term of terms) {
    const letter = letterOf(term.term);
    letters.set(letter, [...(letters.get(letter) ?? []), term]);
  }
  return [...letters].map(([letter, ofLetter]) => ({ letter, terms: ofLetter }));
}

function letterOf(term: string): string {
  const [first = ''] = term.normalize('NFD');
  return /\p{L}/u.test(first) ? first.toUpperCase() : '#';
}
