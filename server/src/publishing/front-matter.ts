import { isMap, isNode, isScalar, isSeq, LineCounter, parseDocument, type Document } from 'yaml';
import type { z } from 'zod';
import type { ProblemList } from './problem-list.ts';
import type { SourceFile } from './read-sources.ts';

export interface Sheet<T> {
  readonly front: T;
  readonly body: string;
  /** Line of the file on which the body begins. */
  readonly bodyLine: number;
  /** Line of the file on which a front matter key stands. */
  readonly lineOf: (...path: PropertyKey[]) => number;
}

const FENCED = /^---\n([\s\S]*?\n)---\n/;
/** The front matter begins on the file's second line. */
const FENCE_LINES = 1;

interface Place {
  readonly node: unknown;
  readonly offset: number;
}

const startOf = (node: unknown): number | undefined => (isNode(node) ? node.range?.[0] : undefined);

function within({ node, offset }: Place, step: PropertyKey): Place {
  if (isMap(node)) {
    const pair = node.items.find(({ key }) => isScalar(key) && key.value === step);
    return { node: pair?.value, offset: startOf(pair?.key) ?? offset };
  }
  const item = isSeq(node) && typeof step === 'number' ? node.items[step] : undefined;
  return { node: item, offset: startOf(item) ?? offset };
}

/** Where in the document a path leads: its key, or as near as the document goes. */
const offsetOf = (document: Document, path: readonly PropertyKey[]): number =>
  path.reduce<Place>(within, { node: document.contents, offset: 0 }).offset;

function pathsOf(issue: z.core.$ZodIssue): PropertyKey[][] {
  if (issue.code !== 'unrecognized_keys') return [issue.path];
  return issue.keys.map((key) => [...issue.path, key]);
}

const messageOf = (issue: z.core.$ZodIssue, path: readonly PropertyKey[]) =>
  issue.code === 'unrecognized_keys'
    ? `front matter: there is no key "${path.map(String).join('.')}"`
    : `front matter, ${path.map(String).join('.') || 'as a whole'}: ${issue.message}`;

function parseFrontMatter(
  file: SourceFile,
  yaml: string,
  problems: ProblemList,
): { document: Document; lineOf: (...path: PropertyKey[]) => number } | null {
  const lines = new LineCounter();
  const document = parseDocument(yaml, { lineCounter: lines, prettyErrors: false });
  for (const { pos, message } of document.errors) {
    problems.add(file.path, lines.linePos(pos[0]).line + FENCE_LINES, `front matter: ${message}`);
  }
  if (document.errors.length > 0) return null;
  return {
    document,
    lineOf: (...path) => lines.linePos(offsetOf(document, path)).line + FENCE_LINES,
  };
}

/** Splits a sheet and checks its front matter; null when a problem was found. */
export function readSheet<T>(
  file: SourceFile,
  schema: z.ZodType<T>,
  problems: ProblemList,
): Sheet<T> | null {
  const [whole, yaml] = FENCED.exec(file.text) ?? [];
  if (whole === undefined || yaml === undefined) {
    problems.add(file.path, 1, 'front matter is missing: begin with a block between --- lines');
    return null;
  }
  const parsed = parseFrontMatter(file, yaml, problems);
  if (!parsed) return null;
  const result = schema.safeParse(parsed.document.toJS());
  for (const issue of result.error?.issues ?? []) {
    for (const path of pathsOf(issue)) {
      problems.add(file.path, parsed.lineOf(...path), messageOf(issue, path));
    }
  }
  if (!result.success) return null;
  return {
    front: result.data,
    body: file.text.slice(whole.length),
    bodyLine: whole.split('\n').length,
    lineOf: parsed.lineOf,
  };
}
