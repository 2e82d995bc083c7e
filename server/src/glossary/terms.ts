import type { CompiledGlossary } from '../publishing/compiled-glossary.ts';
import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import { parseText } from '../publishing/markdown.ts';
import { oneLine, plainText } from '../publishing/plain-text.ts';

/** A term with everything that is said of it. */
export interface Term {
  readonly term: string;
  readonly means: string;
  /** What else it goes by. */
  readonly also: readonly string[];
  /** Numbers of the sheets that explain it, in the order of the course. */
  readonly sheets: readonly string[];
}

const keyOf = (form: string) => form.trim().toLowerCase();

/** Makes one list of the glossary's words and those of every lesson, by alphabet. */
export function gatherTerms(
  glossaries: readonly CompiledGlossary[],
  lessons: readonly CompiledLesson[],
): Term[] {
  const terms = new Map<string, Term>();
  const byForm = new Map<string, string>();
  const add = (term: Term) => {
    const key = keyOf(term.term);
    terms.set(key, term);
    for (const form of [term.term, ...term.also]) byForm.set(keyOf(form), key);
  };
  for (const { term, means, also, sheet } of glossaries.flatMap(({ words }) => words)) {
    add({ term, means, also, sheets: sheet === null ? [] : [sheet] });
  }
  for (const { number, words } of lessons) {
    for (const { term, meaning } of words) {
      const known = terms.get(byForm.get(keyOf(term)) ?? '');
      if (!known) add({ term, means: meaning, also: [], sheets: [number] });
      else if (!known.sheets.includes(number)) {
        terms.set(keyOf(known.term), { ...known, sheets: [...known.sheets, number] });
      }
    }
  }
  return [...terms.values()].sort((a, b) => a.term.localeCompare(b.term, 'en'));
}

/** Read once: a published lesson does not change. */
const texts = new WeakMap<CompiledLesson, string>();

function textOf(lesson: CompiledLesson): string {
  const kept = texts.get(lesson);
  if (kept !== undefined) return kept;
  const text = (parseText(lesson.body).children ?? []).map((node) => plainText(node)).join('\n');
  const whole = oneLine(text).toLowerCase();
  texts.set(lesson, whole);
  return whole;
}

const isLetter = (sign: string | undefined) => sign !== undefined && /[\p{L}\p{N}]/u.test(sign);

function holds(text: string, form: string): boolean {
  for (let at = text.indexOf(form); at >= 0; at = text.indexOf(form, at + 1)) {
    if (!isLetter(text[at - 1]) && !isLetter(text[at + form.length])) return true;
  }
  return false;
}

/** The terms that a lesson uses or lists as its own. */
export function termsIn(lesson: CompiledLesson, terms: readonly Term[]): Term[] {
  const text = textOf(lesson);
  return terms.filter(
    ({ term, also, sheets }) =>
      sheets.includes(lesson.number) || [term, ...also].some((form) => holds(text, keyOf(form))),
  );
}

/** Names a term's place on the glossary page. */
export const termAnchor = (term: string): string =>
  keyOf(term)
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-|-$/g, '');
