import type { Blueprint, CompiledQuestion } from '@ferrule/assessments';
import { createHash } from 'node:crypto';
import { checkContent, checkPaperPool } from './check-content.ts';
import type { CompiledLesson } from './compiled-lesson.ts';
import { compileLesson, type LessonReferences } from './compile-lesson.ts';
import type { ContentKind } from './content.ts';
import type { ReadCourse } from './course-sheet.ts';
import type { ReadGlossary } from './glossary-sheet.ts';
import type { ProblemList } from './problem-list.ts';
import { readContent, referencesOf, type Read } from './read-content.ts';
import type { SourceFile, Sources } from './read-sources.ts';

/** Version of the compiled form of courses, lessons and glossaries. */
const FORMAT_VERSION = 2;

/** One revision, ready to be stored. */
export interface Revision {
  readonly kind: ContentKind;
  readonly slug: string;
  readonly language: string;
  readonly revision: string;
  readonly path: string;
  readonly source: string;
  readonly hash: Buffer;
  readonly formatVersion: number;
  readonly compiled: object;
  readonly pool: 'practice' | 'paper' | null;
  readonly subject: string | null;
  readonly lesson: string | null;
}

export interface CompiledContent {
  readonly revisions: readonly Revision[];
  readonly schemes: readonly { path: string; scheme: Blueprint['scheme'] }[];
}

const sha256 = (text: string) => createHash('sha256').update(text).digest();

const courseRevision = ({ file, compiled }: ReadCourse): Revision => ({
  kind: 'course',
  ...pick(compiled),
  ...sourceOf(file),
  formatVersion: FORMAT_VERSION,
  compiled,
  pool: null,
  subject: null,
  lesson: null,
});

const lessonRevision = (file: SourceFile, compiled: CompiledLesson, hash: Buffer): Revision => ({
  kind: 'lesson',
  ...pick(compiled),
  ...sourceOf(file),
  hash,
  formatVersion: FORMAT_VERSION,
  compiled,
  pool: 'practice',
  subject: compiled.subject,
  lesson: compiled.number,
});

const questionRevision = ({ file, value }: Read<CompiledQuestion>): Revision => ({
  kind: 'question',
  ...pick(value.meta),
  ...sourceOf(file),
  formatVersion: value.formatVersion,
  compiled: value,
  pool: value.meta.pool,
  subject: value.meta.subject,
  lesson: value.meta.lesson,
});

const glossaryRevision = ({ file, compiled }: ReadGlossary): Revision => ({
  kind: 'glossary',
  ...pick(compiled),
  ...sourceOf(file),
  formatVersion: FORMAT_VERSION,
  compiled,
  pool: null,
  subject: null,
  lesson: null,
});

const blueprintRevision = ({ file, value }: Read<Blueprint>): Revision => ({
  kind: 'blueprint',
  ...pick(value),
  ...sourceOf(file),
  formatVersion: value.formatVersion,
  compiled: value,
  pool: null,
  subject: null,
  lesson: null,
});

const pick = ({
  slug,
  language,
  revision,
}: {
  slug: string;
  language: string;
  revision: string;
}) => ({
  slug,
  language,
  revision,
});

const sourceOf = ({ path, text }: SourceFile) => ({ path, source: text, hash: sha256(text) });

/**
 * Checks and compiles everything; each thing wrong goes to the list of problems. A paper pool
 * that is kept elsewhere need not be among the sheets.
 */
export function compileContent(
  sources: Sources,
  problems: ProblemList,
  withPaperPool = true,
): CompiledContent {
  const content = readContent(sources, problems);
  const { courses, lessons, questions, blueprints } = content;
  const shared = referencesOf(content);
  checkContent(content, shared, problems);
  if (withPaperPool) checkPaperPool(content, problems);
  const references: LessonReferences = {
    ...shared,
    questions: new Map(questions.map(({ value }) => [value.meta.slug, value])),
  };
  return {
    revisions: [
      ...questions.map(questionRevision),
      ...lessons.map(({ file, sheet }) => {
        const { compiled, hash } = compileLesson(file, sheet, references, problems);
        return lessonRevision(file, compiled, hash);
      }),
      ...courses.map(courseRevision),
      ...content.glossaries.map(glossaryRevision),
      ...blueprints.map(blueprintRevision),
    ],
    schemes: blueprints.map(({ file, value }) => ({ path: file.path, scheme: value.scheme })),
  };
}
