import type { Tree } from './compiled-lesson.ts';

/** A node of a hast tree. */
export interface TreeNode {
  readonly type: string;
  readonly tagName?: string;
  readonly properties?: Readonly<Record<string, unknown>>;
  readonly value?: string;
  readonly children?: readonly TreeNode[];
  readonly position?: { readonly start: { readonly line: number } };
}

/** Gives a node, another in its place, or null to leave it out. */
type Replace = (node: TreeNode) => TreeNode | null;

function plainNode(node: TreeNode, replace: Replace): TreeNode[] {
  const kept = replace(node);
  if (!kept || !['element', 'text'].includes(kept.type)) return [];
  if (kept.type === 'text') return [{ type: 'text', value: kept.value ?? '' }];
  return [
    {
      type: 'element',
      tagName: kept.tagName ?? '',
      properties: kept.properties ?? {},
      children: (kept.children ?? []).flatMap((child) => plainNode(child, replace)),
    },
  ];
}

/** A tree of elements and text alone, without positions: what is kept and sent. */
export function plainTree(root: TreeNode, replace: Replace): Tree {
  return {
    type: 'root',
    children: (root.children ?? []).flatMap((child) => plainNode(child, replace)),
  };
}
