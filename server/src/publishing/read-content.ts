import {
  parseBlueprint,
  parseQuestion,
  SheetInvalid,
  type Blueprint,
  type CompiledQuestion,
} from '@ferrule/assessments';
import { basename } from 'node:path';
import { readCourse, type Pools, type ReadCourse } from './course-sheet.ts';
import { fillSums } from './fill-sums.ts';
import { readSheet, type Sheet } from './front-matter.ts';
import { readGlossary, type ReadGlossary } from './glossary-sheet.ts';
import { lessonFrontMatter, type LessonFrontMatter } from './lesson-front-matter.ts';
import type { ProblemList } from './problem-list.ts';
import type { LessonFile, SourceFile, Sources } from './read-sources.ts';
import type { LinkTargets } from './text-checks.ts';

export interface Read<T> {
  readonly file: SourceFile;
  readonly value: T;
}

export interface ReadLesson {
  readonly file: LessonFile;
  readonly sheet: Sheet<LessonFrontMatter>;
}

function readLessons(files: readonly LessonFile[], problems: ProblemList): ReadLesson[] {
  return files.flatMap((file) => {
    const sheet = readSheet(file, lessonFrontMatter, problems);
    return sheet ? [{ file, sheet: fillSums(file, sheet, problems) }] : [];
  });
}

/** Every sheet that could be read by itself, and the names of those that could not. */
export interface ReadContent {
  readonly courses: readonly ReadCourse[];
  readonly glossaries: readonly ReadGlossary[];
  readonly lessons: readonly ReadLesson[];
  readonly questions: readonly Read<CompiledQuestion>[];
  readonly blueprints: readonly Read<Blueprint>[];
  readonly unread: {
    readonly lessons: boolean;
    readonly questions: readonly string[];
    readonly blueprints: readonly string[];
  };
}

/** Reads each file with a library that throws on the first sheet that is not sound. */
function readEach<T>(
  files: readonly SourceFile[],
  read: (text: string, path: string) => T,
  problems: ProblemList,
): Read<T>[] {
  return files.flatMap((file) => {
    try {
      return [{ file, value: read(file.text, file.path) }];
    } catch (error) {
      if (!(error instanceof SheetInvalid)) throw error;
      for (const { line, message } of error.issues) problems.add(file.path, line, message);
      return [];
    }
  });
}

/** Names of the files nothing could be read from; their own problems are told already. */
const unreadNames = (files: readonly SourceFile[], read: readonly Read<unknown>[]) =>
  files
    .filter(({ path }) => !read.some(({ file }) => file.path === path))
    .map(({ path }) => basename(path, '.md'));

/** Reads each sheet by itself; what it says of others is checked afterwards. */
export function readContent(sources: Sources, problems: ProblemList): ReadContent {
  const questions = readEach(sources.questions, parseQuestion, problems);
  const blueprints = readEach(sources.blueprints, parseBlueprint, problems);
  const lessons = readLessons(sources.lessons, problems);
  return {
    courses: sources.courses.flatMap((file) => readCourse(file, problems) ?? []),
    glossaries: sources.glossaries.flatMap((file) => readGlossary(file, problems) ?? []),
    ...{ lessons, questions, blueprints },
    unread: {
      lessons: lessons.length < sources.lessons.length,
      questions: unreadNames(sources.questions, questions),
      blueprints: unreadNames(sources.blueprints, blueprints),
    },
  };
}

const listedSheets = ({ courses }: ReadContent) =>
  courses.flatMap(({ compiled }) => compiled.units.flatMap(({ sheets }) => sheets));

const listedWorksheets = ({ courses }: ReadContent) =>
  courses.flatMap(({ compiled }) =>
    compiled.units.flatMap(({ worksheet }) => (worksheet ? [worksheet.number] : [])),
  );

/** What one sheet may name of the others. */
export function referencesOf(content: ReadContent): { pools: Pools; targets: LinkTargets } {
  const { lessons, questions, blueprints, unread } = content;
  const numbers = lessons.map(({ sheet }) => sheet.front.number);
  const papers = blueprints.map(({ value }) => value.slug);
  return {
    pools: new Map([
      ...unread.questions.map((slug) => [slug, 'unread'] as const),
      ...questions.map(({ value: { meta } }) => [meta.slug, meta.pool] as const),
    ]),
    targets: {
      sheets: new Set(unread.lessons ? [...numbers, ...listedSheets(content)] : numbers),
      worksheets: new Set(listedWorksheets(content)),
      papers: new Set([...papers, ...unread.blueprints]),
    },
  };
}
