import {
  drawingData,
  drawQuestion,
  workQuestion,
  type CompiledQuestion,
} from '@ferrule/assessments';
import { createHash } from 'node:crypto';
import type { CompiledFigure, CompiledLesson, Tree } from './compiled-lesson.ts';
import { whyNotPractice, type Pools } from './course-sheet.ts';
import { readDrawing } from './drawings.ts';
import { typesetFormulas } from './formulas.ts';
import type { Sheet } from './front-matter.ts';
import { readBlocks, type FigureBlock, type LessonBlocks } from './lesson-blocks.ts';
import { headingsIn } from './lesson-headings.ts';
import type { LessonFrontMatter } from './lesson-front-matter.ts';
import { checkObjectives, objectivesOf } from './lesson-objectives.ts';
import { isFormula, nodesOf, parseText, sourceOf, type TextNode } from './markdown.ts';
import type { ProblemList } from './problem-list.ts';
import type { LessonFile } from './read-sources.ts';
import { checkText, type Complain, type LinkTargets } from './text-checks.ts';

export interface LessonReferences {
  readonly questions: ReadonlyMap<string, CompiledQuestion>;
  readonly pools: Pools;
  readonly targets: LinkTargets;
}

interface LessonWork {
  readonly file: LessonFile;
  readonly sheet: Sheet<LessonFrontMatter>;
  readonly references: LessonReferences;
  readonly problems: ProblemList;
  readonly complain: Complain;
}

export interface LessonOutcome {
  readonly compiled: CompiledLesson;
  /** Changes with the text, the drawings, its sums, and the questions that are worked in it. */
  readonly hash: Buffer;
}

/** Paragraphs that hold one formula and nothing else. */
const formulasAlone = (root: TextNode): readonly TextNode[] =>
  (root.children ?? []).filter(
    ({ type, children }) =>
      type === 'paragraph' && children?.length === 1 && children[0]?.type === 'inlineMath',
  );

/** A formula alone becomes a block of its own: it is no paragraph, and takes no number. */
function withFormulaBlocks(body: string, alone: readonly TextNode[]): string {
  return alone.reduceRight((text, node) => {
    const from = node.position?.start.offset ?? 0;
    const to = node.position?.end.offset ?? from;
    const latex = node.children?.[0]?.value ?? '';
    return `${text.slice(0, from)}$$\n${latex}\n$$${text.slice(to)}`;
  }, body);
}

function drawingOf(work: LessonWork, figure: FigureBlock, name: string): Tree | null {
  const file = work.file.drawings.get(name);
  if (!file) {
    work.complain(figure.node, `missing figure file ${name}: it must lie beside the lesson`);
    return null;
  }
  const prefix = `s${work.sheet.front.number.replace('.', '-')}-${name.replace('.svg', '')}`;
  return readDrawing(file, prefix, work.problems);
}

function compileFigures(work: LessonWork, blocks: LessonBlocks): Record<string, CompiledFigure> {
  const figures: Record<string, CompiledFigure> = {};
  for (const figure of blocks.figures) {
    if (figures[figure.src]) work.complain(figure.node, `figure ${figure.src} is shown twice`);
    const tree = drawingOf(work, figure, figure.src);
    const narrow = figure.narrow ? drawingOf(work, figure, figure.narrow) : null;
    if (!tree) continue;
    const long = sourceOf(work.sheet.body, figure.description.children ?? []);
    figures[figure.src] = { tree, narrow, short: figure.short, long };
  }
  return figures;
}

const workedSeed = (question: string, seed: string) =>
  createHash('sha256').update(`worked|${question}|${seed}`).digest('hex');

function compileWorked(work: LessonWork, blocks: LessonBlocks): CompiledLesson['worked'] {
  const worked: Record<string, CompiledLesson['worked'][string]> = {};
  for (const { node, question, seed } of [...blocks.worked, ...blocks.tries]) {
    const reason = whyNotPractice(question, work.references.pools);
    if (reason) work.complain(node, reason);
    const compiled = work.references.questions.get(question);
    if (reason || !compiled || !seed) continue;
    const drawn = drawQuestion(compiled, workedSeed(question, seed));
    worked[`${question}#${seed}`] = workQuestion(compiled, drawn);
  }
  return worked;
}

/** Recall questions are short Markdown of their own, in the front matter. */
function checkRecall({ file, sheet, references, problems }: LessonWork): void {
  sheet.front.recall.forEach(({ ask, answer }, index) => {
    const at = sheet.lineOf('recall', index);
    for (const text of [ask, answer]) {
      const root = parseText(text);
      checkText(root, references.targets, (_, message) => problems.add(file.path, at, message));
      if ([...nodesOf(root)].some(isFormula)) {
        problems.add(
          file.path,
          at,
          'formulas do not stand in a recall question: write it in words',
        );
      }
    }
  });
}

function hashOf(work: LessonWork, blocks: LessonBlocks): Buffer {
  const hash = createHash('sha256').update(work.file.text);
  const names = blocks.figures.flatMap(({ src, narrow }) => (narrow ? [src, narrow] : [src]));
  for (const name of [...new Set(names)].sort()) {
    hash.update(`\0${name}\0${work.file.drawings.get(name)?.text ?? ''}`);
  }
  for (const { question, seed } of blocks.worked) {
    const revision = work.references.questions.get(question)?.meta.revision ?? '';
    hash.update(`\0${question}#${seed}@${revision}`);
  }
  if (work.file.text.includes(':sum[')) {
    const { body, front } = work.sheet;
    hash.update(`\0${JSON.stringify([body, front.lead, front.recall])}`);
  }
  for (const { kind } of blocks.drawings) hash.update(`\0${JSON.stringify(drawingData(kind))}`);
  return hash.digest();
}

/** Compiles a lesson whose front matter is sound; problems are gathered, not thrown. */
export function compileLesson(
  file: LessonFile,
  sheet: Sheet<LessonFrontMatter>,
  references: LessonReferences,
  problems: ProblemList,
): LessonOutcome {
  const complain: Complain = (node, message) =>
    problems.add(file.path, (node.position?.start.line ?? 1) + sheet.bodyLine - 1, message);
  const work: LessonWork = { file, sheet, references, problems, complain };
  const root = parseText(sheet.body);
  const alone = formulasAlone(root);
  checkText(root, references.targets, complain);
  checkRecall(work);
  checkObjectives({ path: file.path, sheet }, references.pools, problems);
  const blocks = readBlocks(root, complain);
  const paragraphs = (root.children ?? []).filter(({ type }) => type === 'paragraph');
  const { words, can, ...front } = sheet.front;
  const body = withFormulaBlocks(sheet.body, alone).trim();
  return {
    hash: hashOf(work, blocks),
    compiled: {
      ...front,
      can: can.map(({ does }) => does),
      objectives: objectivesOf(sheet.front),
      words: Object.entries(words).map(([term, meaning]) => ({ term, meaning })),
      body,
      paragraphs: paragraphs.length - alone.length,
      headings: headingsIn(body),
      formulas: typesetFormulas(root, alone, complain),
      figures: compileFigures(work, blocks),
      drawings: Object.fromEntries(blocks.drawings.map(({ kind }) => [kind, drawingData(kind)])),
      worked: compileWorked(work, blocks),
      tries: [...new Set(blocks.tries.map(({ question }) => question))],
    },
  };
}
