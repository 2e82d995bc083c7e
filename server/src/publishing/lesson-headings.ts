import type { CompiledLesson, LessonHeading } from './compiled-lesson.ts';
import { nodesOf, parseText, type TextNode } from './markdown.ts';

const wordsOf = (node: TextNode) =>
  [...nodesOf(node)]
    .map(({ value }) => value ?? '')
    .join('')
    .trim();

/** The headings of a lesson's compiled text, each with the number of the paragraph under it. */
export function headingsIn(body: string): LessonHeading[] {
  const nodes = parseText(body).children ?? [];
  const last = nodes.filter(({ type }) => type === 'paragraph').length;
  let paragraph = 1;
  return nodes.flatMap((node) => {
    if (node.type === 'paragraph') paragraph += 1;
    if (node.type !== 'heading') return [];
    return [{ text: wordsOf(node), paragraph: Math.max(1, Math.min(paragraph, last)) }];
  });
}

/** A lesson that was stored before headings were kept is read again. */
export const headingsOf = ({
  headings,
  body,
}: Pick<CompiledLesson, 'headings' | 'body'>): readonly LessonHeading[] =>
  headings ?? headingsIn(body);
