import { fromHtml } from 'hast-util-from-html';
import { sanitize, type Schema } from 'hast-util-sanitize';
import type { Tree } from './compiled-lesson.ts';
import { DRAWING_ATTRIBUTES, DRAWING_CLASSES } from './drawing-rules.ts';
import { plainTree, type TreeNode } from './plain-tree.ts';
import type { ProblemList } from './problem-list.ts';
import type { SourceFile } from './read-sources.ts';

/** The same rules for the cleaner, which has the last word on what leaves. */
const SCHEMA: Schema = {
  tagNames: Object.keys(DRAWING_ATTRIBUTES),
  attributes: Object.fromEntries(
    Object.entries(DRAWING_ATTRIBUTES).map(([tag, names]) => [tag, [...names]]),
  ),
  clobber: [],
  strip: ['script', 'style'],
};

type Complain = (line: number, message: string) => void;

function checkClasses(node: TreeNode, complain: (message: string) => void): void {
  const names = node.properties?.['className'];
  for (const name of Array.isArray(names) ? names.map(String) : []) {
    if (!DRAWING_CLASSES.has(name)) complain(`class "${name}" is not one of the drawing classes`);
  }
}

const outsideReference = (value: unknown) =>
  typeof value === 'string' && /url\((?!#)|javascript:|data:|https?:/i.test(value);

function checkAttributes(node: TreeNode, complain: (message: string) => void): void {
  const tag = node.tagName ?? '';
  const allowed = DRAWING_ATTRIBUTES[tag] ?? [];
  for (const [name, value] of Object.entries(node.properties ?? {})) {
    if (!allowed.includes(name)) complain(`attribute ${name} is not allowed on <${tag}>`);
    else if (name !== 'xmlns' && outsideReference(value)) {
      complain(`attribute ${name} on <${tag}> points outside the drawing`);
    }
  }
  checkClasses(node, complain);
}

function checkNode(node: TreeNode, complain: Complain): void {
  const line = node.position?.start.line ?? 1;
  if (node.type === 'element') {
    const tag = node.tagName ?? '';
    if (tag in DRAWING_ATTRIBUTES) checkAttributes(node, (message) => complain(line, message));
    else complain(line, `element <${tag}> is not allowed in a drawing`);
  }
  for (const child of node.children ?? []) checkNode(child, complain);
}

function checkRoot(root: TreeNode, complain: Complain): void {
  const elements = (root.children ?? []).filter(({ type }) => type === 'element');
  const [svg] = elements;
  if (elements.length !== 1 || svg?.tagName !== 'svg') {
    complain(1, 'the file must hold one <svg> and nothing beside it');
    return;
  }
  const viewBox = svg.properties?.['viewBox'];
  if (typeof viewBox !== 'string' || !/^-?[\d.]+( -?[\d.]+){3}$/.test(viewBox)) {
    complain(1, 'the <svg> needs a viewBox of four numbers');
  }
}

/** Line breaks between elements, which draw nothing. */
const isLayout = ({ type, value }: TreeNode) => type === 'text' && /^\s*\n\s*$/.test(value ?? '');

const OWN_REFERENCE = /url\(#([^)]+)\)/g;

/** Names inside a drawing made its own, since several drawings share one page. */
function withOwnNames(prefix: string) {
  const own = (name: string) => `${prefix}-${name}`;
  return (node: TreeNode): TreeNode | null => {
    if (node.type !== 'element') return isLayout(node) ? null : node;
    const properties = Object.entries(node.properties ?? {}).map(([key, value]) => {
      if (typeof value !== 'string') return [key, value] as const;
      if (key === 'id' || key === 'ariaLabelledBy') return [key, own(value)] as const;
      const renamed = value.replaceAll(OWN_REFERENCE, (_, name: string) => `url(#${own(name)})`);
      return [key, renamed] as const;
    });
    return { ...node, properties: Object.fromEntries(properties) };
  };
}

/** Checks a drawing and gives its tree; null when a problem was found. */
export function readDrawing(file: SourceFile, prefix: string, problems: ProblemList): Tree | null {
  const root = fromHtml(file.text, { fragment: true, space: 'svg' }) as unknown as TreeNode;
  let isSound = true;
  const complain: Complain = (line, message) => {
    isSound = false;
    problems.add(file.path, line, message);
  };
  checkRoot(root, complain);
  checkNode(root, complain);
  if (!isSound) return null;
  const clean = sanitize(root as unknown as Parameters<typeof sanitize>[0], SCHEMA);
  return plainTree(clean, withOwnNames(prefix));
}
