import type { ProblemList } from './problem-list.ts';
import type { ReadContent } from './read-content.ts';

interface Definition {
  readonly form: string;
  readonly meaning: string;
  readonly path: string;
  readonly line: number;
}

/** Terms are the same whatever letters they begin with. */
const keyOf = (form: string) => form.trim().toLowerCase();

/** Every form of every term, with where it is defined. */
function definitionsIn({ lessons, glossaries }: ReadContent): Definition[] {
  return [
    ...glossaries.flatMap(({ file: { path }, sheet, compiled }) =>
      compiled.words.flatMap(({ term, means, also }) =>
        [term, ...also].map((form) => ({
          ...{ form, meaning: means, path, line: sheet.lineOf('words', term) },
        })),
      ),
    ),
    ...lessons.flatMap(({ file: { path }, sheet }) =>
      Object.entries(sheet.front.words).map(([form, meaning]) => ({
        ...{ form, meaning, path, line: sheet.lineOf('words', form) },
      })),
    ),
  ];
}

/** Forms of all terms of lessons and glossary, in small letters. */
export const knownForms = (content: ReadContent): ReadonlySet<string> =>
  new Set(definitionsIn(content).map(({ form }) => keyOf(form)));

/** One term, one meaning: whoever looks a term up must not find two. */
export function checkWords(content: ReadContent, problems: ProblemList): void {
  const first = new Map<string, Definition>();
  for (const definition of definitionsIn(content)) {
    const { form, meaning, path, line } = definition;
    const other = first.get(keyOf(form));
    if (!other) first.set(keyOf(form), definition);
    else if (other.meaning !== meaning) {
      problems.add(
        path,
        line,
        `"${form}" has another meaning in ${other.path}:${other.line} ("${other.meaning}"): say the same in both`,
      );
    }
  }
}

/** Where glossary words point to sheets that are not there. */
export function wordSheetsMissing({
  glossaries,
  lessons,
}: ReadContent): { path: string; line: number; sheet: string }[] {
  const numbers = new Set(lessons.map(({ sheet }) => sheet.front.number));
  return glossaries.flatMap(({ file: { path }, sheet: { lineOf }, compiled }) =>
    compiled.words.flatMap(({ term, sheet }) =>
      sheet === null || numbers.has(sheet)
        ? []
        : [{ path, line: lineOf('words', term, 'sheet'), sheet }],
    ),
  );
}
