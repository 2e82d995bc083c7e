import remarkDirective from 'remark-directive';
import remarkGfm from 'remark-gfm';
import remarkMath from 'remark-math';
import remarkParse from 'remark-parse';
import { unified } from 'unified';

/** A node of the parsed text, with what the checks look at. */
export interface TextNode {
  readonly type: string;
  readonly value?: string;
  readonly depth?: number;
  readonly url?: string;
  /** Of a directive. */
  readonly name?: string;
  readonly attributes?: Readonly<Record<string, string | null | undefined>> | null;
  readonly children?: readonly TextNode[];
  readonly position?: {
    readonly start: { readonly line: number; readonly offset?: number };
    readonly end: { readonly offset?: number };
  };
}

const parser = unified().use(remarkParse).use(remarkGfm).use(remarkMath).use(remarkDirective);

/** Parses a lesson's text just as its page will. */
export const parseText = (text: string): TextNode => parser.parse(text);

/** The node and all within it, in reading order. */
export function* nodesOf(node: TextNode): Generator<TextNode> {
  yield node;
  for (const child of node.children ?? []) yield* nodesOf(child);
}

/** The source of a run of nodes. */
export function sourceOf(text: string, nodes: readonly TextNode[]): string {
  const from = nodes[0]?.position?.start.offset ?? 0;
  const to = nodes.at(-1)?.position?.end.offset ?? from;
  return text.slice(from, to);
}

export const isFormula = ({ type }: TextNode): boolean => type === 'math' || type === 'inlineMath';
