import { z } from 'zod';
import type { CompiledGlossary } from './compiled-glossary.ts';
import { readSheet, type Sheet } from './front-matter.ts';
import { parseText } from './markdown.ts';
import type { ProblemList } from './problem-list.ts';
import type { GlossaryFile } from './read-sources.ts';
import { day, language, lessonNumber, line, revision } from './sheet-fields.ts';

const glossaryFrontMatter = z.strictObject({
  revision,
  issued: day,
  language,
  words: z.record(
    line(60),
    z.strictObject({
      means: line(300),
      /** Other forms: the plural, what others call it. */
      also: z.array(line(60)).max(12).default([]),
      /** The sheet that explains it. */
      sheet: lessonNumber.optional(),
    }),
  ),
});
type GlossaryFrontMatter = z.infer<typeof glossaryFrontMatter>;

export interface ReadGlossary {
  readonly file: GlossaryFile;
  readonly sheet: Sheet<GlossaryFrontMatter>;
  readonly compiled: CompiledGlossary;
}

/** Reads the glossary of a course; what its words refer to is checked later. */
export function readGlossary(file: GlossaryFile, problems: ProblemList): ReadGlossary | null {
  const sheet = readSheet(file, glossaryFrontMatter, problems);
  if (!sheet) return null;
  if (parseText(sheet.body).children?.length) {
    problems.add(file.path, sheet.bodyLine, 'a glossary has only its words: nothing stands here');
  }
  const { words, ...front } = sheet.front;
  return {
    ...{ file, sheet },
    compiled: {
      ...front,
      slug: file.course,
      words: Object.entries(words).map(([term, { means, also, sheet: explained = null }]) => ({
        ...{ term, means, also, sheet: explained },
      })),
    },
  };
}
