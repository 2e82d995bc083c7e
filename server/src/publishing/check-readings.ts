import type { CompiledQuestion } from '@ferrule/assessments';
import { z } from 'zod';
import { readSheet } from './front-matter.ts';
import { headingsIn } from './lesson-headings.ts';
import type { ProblemList } from './problem-list.ts';
import type { Read, ReadContent } from './read-content.ts';

const read = z.string().optional();

/** All that is looked for here; the sheet itself has been found sound. */
const readingFrontMatter = z.looseObject({
  read,
  ask: z.record(z.string(), z.looseObject({ read })).default({}),
});

/** Whether a sheet may name a heading at all: most need not be read twice. */
const NAMES_ONE = /\bread['"]?\s*:/;

interface Reading {
  readonly heading: string;
  readonly line: number;
}

function readingsOf({ file }: Read<CompiledQuestion>, problems: ProblemList): Reading[] {
  const sheet = NAMES_ONE.test(file.text) ? readSheet(file, readingFrontMatter, problems) : null;
  if (!sheet) return [];
  const { front, lineOf } = sheet;
  return [
    { heading: front.read, line: lineOf('read') },
    ...Object.entries(front.ask).map(([part, asked]) => ({
      heading: asked.read,
      line: lineOf('ask', part, 'read'),
    })),
  ].flatMap(({ heading, line }) => (heading === undefined ? [] : [{ heading, line }]));
}

/**
 * Whether the paragraphs that questions send their readers to are there. A lesson that is not
 * issued yet has none to look for.
 */
export function checkReadings({ questions, lessons }: ReadContent, problems: ProblemList): void {
  const headings = new Map(
    lessons.map(({ sheet }) => [sheet.front.number, headingsIn(sheet.body)] as const),
  );
  for (const question of questions) {
    const { lesson } = question.value.meta;
    const known = headings.get(lesson)?.map(({ text }) => text);
    if (!known) continue;
    for (const { heading, line } of readingsOf(question, problems)) {
      if (known.includes(heading.trim())) continue;
      const choice = known.length > 0 ? `write ${known.join(' | ')}` : 'it has no headings';
      problems.add(
        question.file.path,
        line,
        `read: sheet ${lesson} has no heading "${heading}": ${choice}`,
      );
    }
  }
}
