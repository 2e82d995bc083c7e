import { fromHtml } from 'hast-util-from-html';
import katex from 'katex';
import type { Tree } from './compiled-lesson.ts';
import { isFormula, nodesOf, type TextNode } from './markdown.ts';
import { plainTree, type TreeNode } from './plain-tree.ts';
import type { Complain } from './text-checks.ts';

function mathOf(node: TreeNode): TreeNode | null {
  if (node.tagName === 'math') return node;
  for (const child of node.children ?? []) {
    const found = mathOf(child);
    if (found) return found;
  }
  return null;
}

/** What would reach outside the formula, such as a link, is an error and not merely left out. */
function refuse({ command }: { command: string }): never {
  throw new Error(`${command} is not allowed`);
}

/** MathML of one formula; the source that KaTeX repeats inside it is left out. */
function typeset(latex: string, isDisplay: boolean): Tree {
  const html = katex.renderToString(latex, {
    output: 'mathml',
    displayMode: isDisplay,
    throwOnError: true,
    trust: refuse,
    strict: 'ignore',
    maxExpand: 200,
  });
  const root = fromHtml(html, { fragment: true }) as unknown as TreeNode;
  const math = mathOf(root);
  return plainTree({ type: 'root', children: math ? [math] : [] }, (node) =>
    node.tagName === 'annotation' ? null : node,
  );
}

/** Every formula of a text, typeset, by its source; those alone in a paragraph are displayed. */
export function typesetFormulas(
  root: TextNode,
  alone: readonly TextNode[],
  complain: Complain,
): Record<string, Tree> {
  const formulas: Record<string, Tree> = {};
  const displayed = new Set(alone.flatMap(({ children }) => children ?? []));
  for (const node of nodesOf(root)) {
    if (!isFormula(node)) continue;
    const latex = node.value ?? '';
    try {
      formulas[latex] ??= typeset(latex, node.type === 'math' || displayed.has(node));
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error);
      complain(node, `formula cannot be read: ${reason}`);
    }
  }
  return formulas;
}
