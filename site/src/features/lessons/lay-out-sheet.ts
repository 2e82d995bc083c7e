/** A node of the parsed text, with what the layout reads and writes. */
export interface TextNode {
  type: string;
  value?: string;
  name?: string;
  attributes?: Record<string, string | null | undefined> | null;
  children?: TextNode[];
  data?: {
    hName?: string;
    hProperties?: Record<string, unknown>;
    hChildren?: { type: 'text'; value: string }[];
  };
}

interface Word {
  term: string;
  meaning: string;
}

interface Row {
  paragraph: number | null;
  prose: TextNode[];
  margin: TextNode[];
}

/** Blocks that run across both columns. */
const wideBlocks = ['figure', 'drawing', 'worked', 'try'];
/** Blocks that stand in the margin, level with the paragraph before them. */
const marginBlocks = ['margin', 'hazard'];

/**
 * Lays the text out as a sheet: each top-level paragraph numbered, with what stands in the margin
 * beside it. Drawn by the components of the same names.
 */
export function layOutSheet({ words }: { words: readonly Word[] }) {
  return (root: TextNode) => {
    nameBlocks(root);
    numberFigures(root);
    const rows = gatherRows(root.children ?? []);
    placeWords(rows, words);
    root.children = rows.map((row) => ('type' in row ? row : rowNode(row)));
  };
}

function nameBlocks(node: TextNode): void {
  if (node.type === 'math' || node.type === 'inlineMath') {
    const properties = { source: node.value ?? '', display: node.type === 'math' };
    node.data = { hName: 'sheet-formula', hProperties: properties, hChildren: [] };
  }
  if (node.name && node.type.endsWith('Directive')) {
    node.data = { hName: `sheet-${node.name}`, hProperties: { ...node.attributes } };
    node.children = (node.children ?? []).filter(({ name }) => name !== 'description');
  }
  node.children?.forEach(nameBlocks);
}

function numberFigures(root: TextNode): void {
  const figures = (root.children ?? []).filter(({ name }) => name === 'figure');
  figures.forEach((figure, index) => {
    figure.data = {
      ...figure.data,
      hProperties: { ...figure.data?.hProperties, number: index + 1 },
    };
  });
}

type Laid = Row | TextNode;

/** A heading opens a row and the paragraph after it joins; everything else follows a paragraph. */
function gatherRows(nodes: TextNode[]): Laid[] {
  const laid: Laid[] = [];
  let paragraphs = 0;
  for (const node of nodes) {
    if (isOneOf(wideBlocks, node)) {
      laid.push(node);
      continue;
    }
    const row = rowFor(node, laid);
    if (isOneOf(marginBlocks, node)) placeInMargin(row, node);
    else row.prose.push(node);
    if (node.type === 'paragraph') row.paragraph = paragraphs += 1;
  }
  return laid;
}

function isOneOf(blocks: string[], { name }: TextNode): boolean {
  return blocks.includes(name ?? '');
}

/** The row at hand, or a new one where this node must open it. */
function rowFor(node: TextNode, laid: Laid[]): Row {
  const last = laid.at(-1);
  const row = last && 'prose' in last ? last : null;
  const opens =
    node.type === 'heading' || (node.type === 'paragraph' && row !== null && !isHeadingAlone(row));
  if (row && !opens) return row;
  const opened: Row = { paragraph: null, prose: [], margin: [] };
  laid.push(opened);
  return opened;
}

/** With nothing beside it, a caution takes the column of the text. */
function placeInMargin(row: Row, node: TextNode): void {
  (row.prose.length === 0 ? row.prose : row.margin).push(node);
}

function isHeadingAlone({ prose }: Row): boolean {
  return prose.length === 1 && prose[0]?.type === 'heading';
}

/** A word is explained beside the first paragraph that uses it. */
function placeWords(laid: Laid[], words: readonly Word[]): void {
  const rows = laid.filter((item): item is Row => 'prose' in item && item.paragraph !== null);
  const [first] = rows;
  if (!first) return;
  const placed = new Map<Row, Word[]>();
  for (const word of words) {
    const row = rows.find(({ prose }) => uses(prose, word.term)) ?? first;
    placed.set(row, [...(placed.get(row) ?? []), word]);
  }
  for (const [row, ofRow] of placed) row.margin.unshift(wordsNode(ofRow));
}

function uses(nodes: TextNode[], term: string): boolean {
  const escaped = term.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
  return new RegExp(`(^|[^\\p{L}])${escaped}`, 'iu').test(nodes.map(textOf).join(' '));
}

function textOf(node: TextNode): string {
  return node.value ?? (node.children ?? []).map(textOf).join('');
}

function wordsNode(words: Word[]): TextNode {
  return {
    type: 'sheetWords',
    data: { hName: 'sheet-margin', hProperties: { title: 'Words' } },
    children: words.map(({ term, meaning }) => ({
      type: 'paragraph',
      children: [
        { type: 'emphasis', children: [{ type: 'text', value: term }] },
        { type: 'text', value: `: ${meaning}` },
      ],
    })),
  };
}

function rowNode({ paragraph, prose, margin }: Row): TextNode {
  return {
    type: 'sheetRow',
    data: { hName: 'sheet-row', hProperties: paragraph === null ? {} : { paragraph } },
    children: [
      column('prose', prose),
      ...(margin.length > 0 ? [column('sheet-margin-column', margin)] : []),
    ],
  };
}

function column(name: string, children: TextNode[]): TextNode {
  return {
    type: 'sheetColumn',
    data: { hName: 'div', hProperties: { className: [name] } },
    children,
  };
}
