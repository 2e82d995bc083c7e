import { type TextNode } from './lay-out-sheet.ts';

interface Term {
  term: string;
  forms: readonly string[];
}

/** Words stay as they are in these. */
const passedOver = ['heading', 'link', 'inlineCode', 'code', 'table', 'math', 'inlineMath'];

/**
 * Marks the first place in the text where each term stands, in whatever form; a `sheet-term` there
 * explains it. Runs after the sheet is laid out: only the column of the text is looked at.
 */
export function markTerms(terms: readonly Term[]) {
  return (root: TextNode) => {
    const open = new Map(terms.map((one) => [one.term, matcherOf(one)]));
    for (const row of root.children ?? []) {
      const [prose] = row.type === 'sheetRow' ? (row.children ?? []) : [];
      if (prose) markIn(prose, open);
    }
  };
}

type Open = Map<string, RegExp>;

/** The longer form first: "voltage drop" before "drop". "Cross-section" is no section. */
function matcherOf({ forms }: Term): RegExp {
  const longestFirst = [...forms].sort((a, b) => b.length - a.length);
  const either = longestFirst.map((form) => form.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')).join('|');
  return new RegExp(`(?<![\\p{L}\\p{N}-])(?:${either})(?![\\p{L}\\p{N}-])`, 'iu');
}

function markIn(node: TextNode, open: Open): void {
  if (!node.children) return;
  node.children = node.children.flatMap((child) => {
    if (passedOver.includes(child.type) || child.name) return [child];
    if (child.type === 'text') return splitText(child.value ?? '', open);
    markIn(child, open);
    return [child];
  });
}

/** The text cut at the terms in it that have not been explained yet. */
function splitText(text: string, open: Open): TextNode[] {
  const found = firstTerm(text, open);
  if (!found) return text ? [{ type: 'text', value: text }] : [];
  open.delete(found.term);
  const end = found.at + found.said.length;
  return [
    ...splitText(text.slice(0, found.at), open),
    termNode(found.term, found.said),
    ...splitText(text.slice(end), open),
  ];
}

interface Found {
  term: string;
  said: string;
  at: number;
}

/** The earliest; of those that begin together, the longest. */
function firstTerm(text: string, open: Open): Found | null {
  let first: Found | null = null;
  for (const [term, matcher] of open) {
    const match = matcher.exec(text);
    if (!match) continue;
    const found = { term, said: match[0], at: match.index };
    if (!first || isBefore(found, first)) first = found;
  }
  return first;
}

function isBefore(one: Found, other: Found): boolean {
  return one.at < other.at || (one.at === other.at && one.said.length > other.said.length);
}

function termNode(term: string, said: string): TextNode {
  return {
    type: 'sheetTerm',
    data: { hName: 'sheet-term', hProperties: { term } },
    children: [{ type: 'text', value: said }],
  };
}
