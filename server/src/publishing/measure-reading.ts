import { nodesOf, parseText, type TextNode } from './markdown.ts';
import { oneLine, plainText } from './plain-text.ts';

/** How a lesson reads. */
export interface ReadingMeasures {
  readonly words: number;
  /** To read it through with a pencil in hand, worked once and tried once. */
  readonly minutes: number;
  /** Words of a sentence of its prose, on average. */
  readonly sentence: number;
  /** What the text sets in emphasis. */
  readonly emphasised: readonly string[];
}

/** What each takes, minutes: common practice, no source. */
const WORDS_A_MINUTE = 130;
const FIGURE = 1;
const WORKED = 2;
const TRY = 3;
const MINUTES: Readonly<Record<string, number>> = {
  figure: FIGURE,
  drawing: FIGURE,
  worked: WORKED,
  try: TRY,
};

/** A description is read in the place of its figure. */
const withoutDescriptions = (node: TextNode): TextNode => ({
  ...node,
  children: (node.children ?? [])
    .filter(({ name }) => name !== 'description')
    .map(withoutDescriptions),
});

const countWords = (text: string, language: string): number =>
  [...new Intl.Segmenter(language, { granularity: 'word' }).segment(text)].filter(
    ({ isWordLike }) => isWordLike,
  ).length;

function sentencesOf(text: string, language: string): number[] {
  const segmenter = new Intl.Segmenter(language, { granularity: 'sentence' });
  return [...segmenter.segment(text)]
    .map(({ segment }) => countWords(segment, language))
    .filter((words) => words > 0);
}

const mean = (figures: readonly number[]): number =>
  figures.length === 0 ? 0 : figures.reduce((sum, one) => sum + one, 0) / figures.length;

/** Measures a lesson's text. */
export function measureReading(body: string, language: string): ReadingMeasures {
  const nodes = [...nodesOf(withoutDescriptions(parseText(body)))];
  const blocks = nodes.filter(({ type }) => ['paragraph', 'heading', 'tableCell'].includes(type));
  const textOf = (node: TextNode) => oneLine(plainText(node));
  const words = blocks.reduce((sum, node) => sum + countWords(textOf(node), language), 0);
  const handled = nodes.reduce((sum, { name = '' }) => sum + (MINUTES[name] ?? 0), 0);
  const prose = blocks.filter(({ type }) => type === 'paragraph');
  return {
    words,
    minutes: Math.round(words / WORDS_A_MINUTE + handled),
    sentence: mean(prose.flatMap((node) => sentencesOf(textOf(node), language))),
    emphasised: [
      ...new Set(nodes.filter(({ type }) => type === 'emphasis').map((node) => textOf(node))),
    ],
  };
}
