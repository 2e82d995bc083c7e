import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import { nodesOf, parseText, type TextNode } from '../publishing/markdown.ts';
import { oneLine, plainText } from '../publishing/plain-text.ts';
import type { SearchEntry } from './search-entry.ts';

const BLOCKS = ['paragraph', 'heading', 'tableCell'];

/** All that a block says, its parts apart. */
const wordsOf = (node: TextNode, { formulas }: CompiledLesson): string =>
  [...nodesOf(node)]
    .filter(({ type }) => BLOCKS.includes(type))
    .map((block) => oneLine(plainText(block, formulas)))
    .join(' ');

interface Passage {
  readonly paragraph: number;
  readonly heading: string | null;
  /** The first under its heading. */
  readonly opens: boolean;
  readonly texts: string[];
}

/** Paragraphs with what follows each: its table, figure, margin note or caution. */
function passagesOf(lesson: CompiledLesson): Passage[] {
  const passages: Passage[] = [];
  let heading: string | null = null;
  let opens = false;
  const openPassage = () => {
    const passage: Passage = { paragraph: passages.length + 1, heading, opens, texts: [] };
    passages.push(passage);
    opens = false;
    return passage;
  };
  for (const node of parseText(lesson.body).children ?? []) {
    const text = wordsOf(node, lesson);
    if (node.type === 'heading') [heading, opens] = [text, true];
    else if (node.type === 'paragraph') openPassage().texts.push(text);
    else if (text) (passages.at(-1) ?? openPassage()).texts.push(text);
  }
  return passages;
}

/**
 * A lesson as what can be found of it: the sheet itself, and each of its paragraphs.
 *
 * @param unit - title of the unit it stands in.
 */
export function lessonEntries(lesson: CompiledLesson, unit: string): SearchEntry[] {
  const { number, title, language, lead, can, recall } = lesson;
  const shared = { title, sheet: number, language };
  const asked = recall.flatMap(({ ask, answer }) => [ask, answer]).map(plainOf);
  return [
    {
      ...shared,
      ...{ kind: 'sheet', paragraph: null, heading: null, link: `/sheets/${number}` },
      ...{ names: title, intro: `${unit} ${lead}`, body: [lead, ...can, ...asked].join(' ') },
    },
    ...passagesOf(lesson).map(({ paragraph, heading, opens, texts }): SearchEntry => ({
      ...shared,
      ...{ kind: 'paragraph', paragraph, heading, link: `/sheets/${number}#p${paragraph}` },
      ...{ names: '', intro: opens ? (heading ?? '') : '', body: texts.join(' ') },
    })),
  ];
}

const plainOf = (markdown: string) =>
  oneLine((parseText(markdown).children ?? []).map((node) => plainText(node)).join(' '));
