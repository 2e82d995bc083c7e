import { toJsxRuntime } from 'hast-util-to-jsx-runtime';
import { Fragment, jsx, jsxs } from 'react/jsx-runtime';

/** A tree of elements as publishing cleaned it: MathML of a formula, SVG of a figure. */
export interface Tree {
  type: 'root';
  children: unknown[];
}

export function DrawnTree({ tree }: { tree: Tree }) {
  return <>{toJsxRuntime(tree as Parameters<typeof toJsxRuntime>[0], { Fragment, jsx, jsxs })}</>;
}
