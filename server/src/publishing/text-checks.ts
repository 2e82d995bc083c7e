import { nodesOf, type TextNode } from './markdown.ts';

/** Says what is wrong with a node. */
export type Complain = (node: TextNode, message: string) => void;

/** What links may lead to, besides the world outside. */
export interface LinkTargets {
  readonly sheets: ReadonlySet<string>;
  readonly worksheets: ReadonlySet<string>;
  readonly papers: ReadonlySet<string>;
}

const LINK_KINDS =
  'a sheet (/sheets/3.4), a worksheet (/worksheets/W3), a paper (/papers/…), or https: or mailto:';

function isKnownTarget(url: string, targets: LinkTargets): boolean {
  if (/^(https?:\/\/[^\s/]+|mailto:[^\s@]+@[^\s@]+)/.test(url)) return true;
  const [, kind = '', name = ''] = /^\/(sheets|worksheets|papers)\/([^/?#]+)$/.exec(url) ?? [];
  if (kind === 'sheets') return targets.sheets.has(name);
  if (kind === 'worksheets') return targets.worksheets.has(name);
  if (kind === 'papers') return targets.papers.has(name);
  return ['/course', '/check'].includes(url);
}

function checkHeadings(root: TextNode, complain: Complain): void {
  let before = 1;
  for (const node of nodesOf(root)) {
    if (node.type !== 'heading') continue;
    const depth = node.depth ?? 1;
    if (depth === 1) complain(node, 'heading order: # is the sheet’s title; begin with ##');
    else if (depth > before + 1) {
      const wanted = '#'.repeat(before + 1);
      complain(node, `heading order: ${'#'.repeat(depth)} skips a level; use ${wanted}`);
    }
    before = Math.max(depth, 2);
  }
}

function checkNode(node: TextNode, targets: LinkTargets, complain: Complain): void {
  if (node.type === 'html') {
    complain(node, `raw HTML is not allowed: ${JSON.stringify((node.value ?? '').slice(0, 40))}`);
  }
  if (node.type === 'image' || node.type === 'imageReference') {
    complain(node, 'pictures stand in a figure block, with a description');
  }
  const isLink = node.type === 'link' || node.type === 'definition';
  if (isLink && !isKnownTarget(node.url ?? '', targets)) {
    complain(node, `broken link "${node.url ?? ''}": link to ${LINK_KINDS}`);
  }
}

/** Headings, links, pictures and raw HTML. */
export function checkText(root: TextNode, targets: LinkTargets, complain: Complain): void {
  checkHeadings(root, complain);
  for (const node of nodesOf(root)) checkNode(node, targets, complain);
}
