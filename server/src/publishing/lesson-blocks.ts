import { DRAWING_KINDS, type DrawingKind } from '@ferrule/assessments';
import { isFormula, nodesOf, type TextNode } from './markdown.ts';
import type { Complain } from './text-checks.ts';

/** A figure as the text calls for it. */
export interface FigureBlock {
  readonly node: TextNode;
  readonly src: string;
  readonly narrow: string | null;
  readonly short: string;
  readonly description: TextNode;
}

/** A worked or try block. */
export interface QuestionBlock {
  readonly node: TextNode;
  readonly question: string;
  readonly seed: string;
}

/** A drawing to handle. */
export interface DrawingBlock {
  readonly node: TextNode;
  readonly kind: DrawingKind;
}

export interface LessonBlocks {
  readonly figures: readonly FigureBlock[];
  readonly drawings: readonly DrawingBlock[];
  readonly worked: readonly QuestionBlock[];
  readonly tries: readonly QuestionBlock[];
}

const DRAWING_NAME = /^[a-z0-9]+(-[a-z0-9]+)*\.svg$/;
const SEED = /^[A-Za-z0-9-]{1,20}$/;
const LEVELS = ['danger', 'warning', 'caution', 'notice', 'mandatory'];

/** Attributes of each block: `!` must be there. */
const BLOCKS: Readonly<Record<string, { form: string; attributes: readonly string[] }>> = {
  hazard: { form: 'containerDirective', attributes: ['level!', 'title!'] },
  margin: { form: 'containerDirective', attributes: ['title!'] },
  local: { form: 'containerDirective', attributes: [] },
  figure: { form: 'containerDirective', attributes: ['src!', 'short!', 'narrow'] },
  description: { form: 'containerDirective', attributes: [] },
  drawing: { form: 'leafDirective', attributes: ['kind!', 'title!'] },
  worked: { form: 'leafDirective', attributes: ['question!', 'seed!'] },
  try: { form: 'leafDirective', attributes: ['question!'] },
};

const attributeOf = (node: TextNode, name: string) => (node.attributes?.[name] ?? '').trim();

function checkBlock(node: TextNode, complain: Complain): boolean {
  const name = node.name ?? '';
  if (node.type === 'textDirective' && name === 'sum') {
    complain(node, 'a sum is written :sum[name]');
    return false;
  }
  if (node.type === 'textDirective') {
    complain(node, `":${name}" reads as a block: put a space after the colon, or \\ before it`);
    return false;
  }
  const block = BLOCKS[name];
  if (!block) {
    complain(node, `there is no block "${name}": use one of ${Object.keys(BLOCKS).join(', ')}`);
    return false;
  }
  if (node.type !== block.form) {
    const colons =
      block.form === 'leafDirective' ? 'two colons and no text' : 'three colons or more';
    complain(node, `block "${name}" is written with ${colons}`);
    return false;
  }
  return checkAttributes(node, block.attributes, complain);
}

function checkAttributes(node: TextNode, known: readonly string[], complain: Complain): boolean {
  const names = known.map((name) => name.replace('!', ''));
  const missing = names.filter((name, at) => known[at]?.endsWith('!') && !attributeOf(node, name));
  for (const name of missing) complain(node, `block "${node.name ?? ''}" needs ${name}="…"`);
  const strange = Object.keys(node.attributes ?? {}).filter((name) => !names.includes(name));
  for (const name of strange) complain(node, `block "${node.name ?? ''}" knows no ${name}`);
  const level = attributeOf(node, 'level');
  if (node.name === 'hazard' && level && !LEVELS.includes(level)) {
    complain(node, `level "${level}" is not one of ${LEVELS.join(', ')}`);
  }
  return missing.length === 0;
}

function checkNames(node: TextNode, names: readonly string[], complain: Complain): void {
  for (const name of names) {
    if (name && !DRAWING_NAME.test(name)) {
      complain(node, `"${name}" is not the name of an SVG file beside the lesson`);
    }
  }
}

function readFigure(node: TextNode, complain: Complain): FigureBlock[] {
  const [src, narrow] = [attributeOf(node, 'src'), attributeOf(node, 'narrow')];
  checkNames(node, [src, narrow], complain);
  const children = node.children ?? [];
  const description = children.find(({ name }) => name === 'description');
  if (!description?.children?.length) {
    complain(node, 'missing description: put a :::description block inside the figure');
    return [];
  }
  for (const inside of nodesOf(description)) {
    if (isFormula(inside)) complain(inside, 'write a description in words: it is read aloud');
  }
  if (!children.some(({ type }) => type === 'paragraph')) {
    complain(node, 'the figure has no caption');
  }
  return [{ node, src, narrow: narrow || null, short: attributeOf(node, 'short'), description }];
}

function readDrawingBlock(node: TextNode, complain: Complain): DrawingBlock[] {
  const kind = DRAWING_KINDS.find((known) => known === attributeOf(node, 'kind'));
  if (kind) return [{ node, kind }];
  complain(
    node,
    `drawing "${attributeOf(node, 'kind')}" is not one of ${DRAWING_KINDS.join(', ')}`,
  );
  return [];
}

function refuseDrawnTwice(drawings: readonly DrawingBlock[], complain: Complain): void {
  drawings.forEach(({ node, kind }, at) => {
    if (drawings.findIndex((other) => other.kind === kind) < at) {
      complain(node, `drawing ${kind} stands twice in this sheet`);
    }
  });
}

function readQuestionBlock(node: TextNode, complain: Complain): QuestionBlock[] {
  const seed = attributeOf(node, 'seed');
  if (node.name === 'worked' && !SEED.test(seed)) {
    complain(node, `seed "${seed}" must be 1 to 20 letters, digits or hyphens`);
    return [];
  }
  return [{ node, question: attributeOf(node, 'question'), seed }];
}

function checkPlaces(parent: TextNode, complain: Complain): void {
  const children = parent.children ?? [];
  children.forEach((node, at) => {
    if (node.name === 'description' && parent.name !== 'figure') {
      complain(node, 'a description stands inside its figure');
    }
    if (node.name === 'margin' && (at === 0 || children[at - 1]?.type === 'heading')) {
      complain(node, 'a margin note stands directly after the paragraph it belongs to');
    }
    checkPlaces(node, complain);
  });
}

/** Finds and checks every block of a lesson. */
export function readBlocks(root: TextNode, complain: Complain): LessonBlocks {
  checkPlaces(root, complain);
  const sound = [...nodesOf(root)].filter(
    (node) => node.type.endsWith('Directive') && checkBlock(node, complain),
  );
  const named = (name: string) => sound.filter((node) => node.name === name);
  const drawings = named('drawing').flatMap((node) => readDrawingBlock(node, complain));
  refuseDrawnTwice(drawings, complain);
  return {
    drawings,
    figures: named('figure').flatMap((node) => readFigure(node, complain)),
    worked: named('worked').flatMap((node) => readQuestionBlock(node, complain)),
    tries: named('try').flatMap((node) => readQuestionBlock(node, complain)),
  };
}
