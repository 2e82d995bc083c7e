import { workSums, type PrintedSum } from '@ferrule/assessments';
import type { Sheet } from './front-matter.ts';
import type { LessonFrontMatter } from './lesson-front-matter.ts';
import { isFormula, nodesOf, parseText } from './markdown.ts';
import type { ProblemList } from './problem-list.ts';
import type { SourceFile } from './read-sources.ts';

const MARK = /(?<!\\):sum\[([^\]\n]*)\](?:\{([^}\n]*)\})?/g;

/** The sums of one lesson, and where to say what is wrong with their use. */
interface Ledger {
  readonly printed: ReadonlyMap<string, PrintedSum>;
  /** Declared, worked or not: what is wrong with the sum itself is told once. */
  readonly declared: ReadonlySet<string>;
}

function ledgerOf(
  file: SourceFile,
  { front, lineOf }: Sheet<LessonFrontMatter>,
  problems: ProblemList,
): Ledger {
  if (front.sums === undefined) return { printed: new Map(), declared: new Set() };
  const { printed, issues } = workSums(front.sums);
  for (const { field, message } of issues) {
    const place = ['sums', ...field].map(String).join('.');
    problems.add(file.path, lineOf('sums', ...field), `${place}: ${message}`);
  }
  const wrong = issues.map(({ field }) => String(field[1]));
  return { printed, declared: new Set([...printed.keys(), ...wrong, ...namesOf(front.sums)]) };
}

const namesOf = (sums: unknown): string[] =>
  ['given', 'steps'].flatMap((block) =>
    Object.keys((sums as Record<string, object | undefined>)[block] ?? {}),
  );

/** Fills the marks of one text; what cannot be filled stays, and is told. */
function fillText(
  text: string,
  { printed, declared }: Ledger,
  complain: (offset: number, message: string) => void,
): string {
  return text.replaceAll(
    MARK,
    (_mark, name: string, attributes: string | undefined, at: number) => {
      const sum = printed.get(name.trim());
      if (attributes !== undefined && attributes.trim() !== 'bare') {
        complain(at, `:sum[${name}] knows only {bare}, not {${attributes}}`);
      }
      if (sum) return attributes === undefined ? sum.text : sum.bare;
      if (!declared.has(name.trim())) {
        const known =
          printed.size > 0 ? `use one of ${[...printed.keys()].join(', ')}` : 'add sums:';
        complain(at, `:sum[${name}] names no sum of this lesson: ${known}`);
      }
      return name;
    },
  );
}

/** Stretches of a text in which nothing is filled: formulas and code. */
function closedStretches(body: string): { from: number; to: number }[] {
  return [...nodesOf(parseText(body))]
    .filter((node) => isFormula(node) || ['code', 'inlineCode'].includes(node.type))
    .map(({ position }) => ({
      from: position?.start.offset ?? 0,
      to: position?.end.offset ?? 0,
    }));
}

function fillBody(
  file: SourceFile,
  { sheet, ledger }: { sheet: Sheet<LessonFrontMatter>; ledger: Ledger },
  problems: ProblemList,
): string {
  const { body, bodyLine } = sheet;
  const complain = (offset: number, message: string) => {
    const line = body.slice(0, offset).split('\n').length + bodyLine - 1;
    problems.add(file.path, line, message);
  };
  const stretches = closedStretches(body);
  for (const { index } of body.matchAll(MARK)) {
    if (!stretches.some(({ from, to }) => index >= from && index < to)) continue;
    complain(index, 'a sum does not stand in a formula: formulas stay symbolic');
  }
  return fillText(body, ledger, complain);
}

/** Every text of the front matter, filled. */
function fillFront<T>(value: T, fill: (text: string, path: PropertyKey[]) => string): T {
  const walk = (one: unknown, path: PropertyKey[]): unknown => {
    if (typeof one === 'string') return fill(one, path);
    if (Array.isArray(one)) return one.map((item, at) => walk(item, [...path, at]));
    if (one === null || typeof one !== 'object') return one;
    return Object.fromEntries(
      Object.entries(one).map(([key, item]) => [
        key,
        // Nothing to fill, and nothing to keep: the sums have been worked.
        key === 'sums' && path.length === 0 ? undefined : walk(item, [...path, key]),
      ]),
    );
  };
  return walk(value, []) as T;
}

/**
 * Puts worked figures where a lesson says `:sum[name]`: in its text, its blocks and their titles,
 * and its front matter. Lines stay where they are.
 */
export function fillSums(
  file: SourceFile,
  sheet: Sheet<LessonFrontMatter>,
  problems: ProblemList,
): Sheet<LessonFrontMatter> {
  const ledger = ledgerOf(file, sheet, problems);
  return {
    ...sheet,
    front: fillFront(sheet.front, (text, path) =>
      fillText(text, ledger, (_, message) => {
        problems.add(file.path, sheet.lineOf(...path), message);
      }),
    ),
    body: sheet.body.includes(':sum[') ? fillBody(file, { sheet, ledger }, problems) : sheet.body,
  };
}
