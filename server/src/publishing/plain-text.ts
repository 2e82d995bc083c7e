import type { Tree } from './compiled-lesson.ts';
import { isFormula, type TextNode } from './markdown.ts';
import type { TreeNode } from './plain-tree.ts';

const letters = ({ value, children }: TreeNode): string =>
  `${value ?? ''}${(children ?? []).map(letters).join('')}`;

/** A text as it reads, without its marks; formulas by the letters they are typeset with. */
export function plainText(node: TextNode, formulas: Readonly<Record<string, Tree>> = {}): string {
  if (isFormula(node)) {
    const tree = formulas[node.value ?? ''];
    return tree ? letters(tree as TreeNode) : (node.value ?? '');
  }
  if (node.type === 'break') return ' ';
  return `${node.value ?? ''}${(node.children ?? []).map((one) => plainText(one, formulas)).join('')}`;
}

/** A plain text on one line. */
export const oneLine = (text: string): string => text.replace(/[ \t\r\n]+/g, ' ').trim();
