import { isNode, LineCounter, parseDocument, type Document, type YAMLError } from 'yaml';
import { type z } from 'zod';
import { SheetInvalid } from './errors.ts';

const LONGEST = 100_000;

/** A Markdown file with YAML front matter, opened but not yet understood. */
export interface SheetFile<T> {
  front: T;
  /** Text before the first `## ` heading. */
  intro: string;
  introLine: number;
  sections: { heading: string; text: string; line: number }[];
  /** Line of a front matter field, counted from the top of the file. */
  lineOf(path: readonly PropertyKey[]): number;
}

/**
 * Splits a sheet and checks its front matter.
 *
 * @throws {SheetInvalid} naming the file and the line of everything that is wrong.
 */
export function openSheet<T>(source: string, path: string, schema: z.ZodType<T>): SheetFile<T> {
  const { yaml, text, textLine } = split(source, path);
  const lines = new LineCounter();
  const document = parseDocument(yaml, { lineCounter: lines, prettyErrors: false });
  const [problem] = [...document.errors, ...document.warnings];
  // What follows the first is its echo as a rule.
  if (problem) {
    const line = lines.linePos(problem.pos[0]).line + 1;
    throw new SheetInvalid(path, [{ line, message: yamlWords(problem) }]);
  }
  const lineOf = (field: readonly PropertyKey[]): number => lineIn(document, lines, field);
  const checked = schema.safeParse(asPlain(document, path));
  if (!checked.success) {
    const issues = checked.error.issues.flatMap((issue) => plainIssues(issue, []));
    throw new SheetInvalid(
      path,
      issues.map(({ field, message }) => ({
        line: lineOf(field),
        message: `${field.join(' › ') || 'front matter'}: ${message}`,
      })),
    );
  }
  return { front: checked.data, ...sectionsOf(text, textLine), introLine: textLine, lineOf };
}

function yamlWords({ code, message }: YAMLError): string {
  if (code === 'DUPLICATE_KEY') return message;
  return `${message}; put a text that holds a comma inside { }, a brace or ": " in quotes.`;
}

interface FieldIssue {
  field: PropertyKey[];
  message: string;
}

/** A field that fits none of several shapes is told what the nearest shape lacks. */
function plainIssues(issue: z.core.$ZodIssue, above: PropertyKey[]): FieldIssue[] {
  const field = [...above, ...issue.path];
  if (issue.code === 'invalid_key') {
    return issue.issues.map(({ message }) => ({ field, message }));
  }
  if (issue.code !== 'invalid_union' || issue.errors.length === 0) {
    return [{ field, message: issue.message }];
  }
  const nearest = issue.errors.reduce((a, b) => (b.length < a.length ? b : a));
  return nearest.flatMap((inner) => plainIssues(inner, field));
}

function split(source: string, path: string): { yaml: string; text: string; textLine: number } {
  if (source.length > LONGEST) {
    const message = `Sheet of ${source.length} characters is over ${LONGEST}; shorten it.`;
    throw new SheetInvalid(path, [{ line: 1, message }]);
  }
  const lines = source.replace(/^\uFEFF/, '').split(/\r?\n/);
  const end = lines.indexOf('---', 1);
  if (lines[0] !== '---' || end < 0) {
    const message = 'Front matter is missing; begin with a line --- and close it with another.';
    throw new SheetInvalid(path, [{ line: 1, message }]);
  }
  return {
    yaml: lines.slice(1, end).join('\n'),
    text: lines.slice(end + 1).join('\n'),
    textLine: end + 2,
  };
}

function asPlain(document: Document, path: string): unknown {
  try {
    return document.toJS({ maxAliasCount: 0 });
  } catch (error) {
    const message = error instanceof Error ? error.message : 'cannot be read';
    throw new SheetInvalid(path, [{ line: 1, message: `Front matter: ${message}` }]);
  }
}

function lineIn(document: Document, lines: LineCounter, field: readonly PropertyKey[]): number {
  for (let length = field.length; length > 0; length -= 1) {
    const node: unknown = document.getIn(field.slice(0, length), true);
    if (isNode(node) && node.range) return lines.linePos(node.range[0]).line + 1;
  }
  return 1;
}

function sectionsOf(
  text: string,
  firstLine: number,
): { intro: string; sections: { heading: string; text: string; line: number }[] } {
  const sections: { heading: string; text: string; line: number }[] = [];
  const intro: string[] = [];
  text.split('\n').forEach((line, index) => {
    const heading = /^## (.+?)\s*$/.exec(line);
    const open = sections.at(-1);
    if (heading) sections.push({ heading: heading[1] ?? '', text: '', line: firstLine + index });
    else if (open) open.text += `${line}\n`;
    else intro.push(line);
  });
  return {
    intro: intro.join('\n').trim(),
    sections: sections.map((section) => ({ ...section, text: section.text.trim() })),
  };
}
