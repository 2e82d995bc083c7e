import {
  parseBlueprint,
  parseQuestion,
  PoolTooSmall,
  SheetInvalid,
  assemblePaper,
  type Blueprint,
  type CompiledQuestion,
} from '@ferrule/assessments';
import { createHash } from 'node:crypto';
import type { CompiledLesson } from './compiled-lesson.ts';
import { compileLesson, type LessonReferences } from './compile-lesson.ts';
import type { ContentKind } from './content.ts';
import { checkCourse, readCourse, type ReadCourse } from './course-sheet.ts';
import { readSheet, type Sheet } from './front-matter.ts';
import { lessonFrontMatter, type LessonFrontMatter } from './lesson-front-matter.ts';
import type { ProblemList } from './problem-list.ts';
import type { LessonFile, SourceFile, Sources } from './read-sources.ts';

/** Version of the compiled form of courses and lessons. */
const FORMAT_VERSION = 1;

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

interface Read<T> {
  readonly file: SourceFile;
  readonly value: T;
}

const sha256 = (text: string) => createHash('sha256').update(text).digest();

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

function refuseRepeats(kind: string, read: readonly Read<string>[], problems: ProblemList): void {
  const first = new Map<string, string>();
  for (const { file, value: slug } of read) {
    const other = first.get(slug);
    if (other === undefined) first.set(slug, file.path);
    else problems.add(file.path, 1, `${kind} "${slug}" is already the name of ${other}`);
  }
}

interface ReadLesson {
  readonly file: LessonFile;
  readonly sheet: Sheet<LessonFrontMatter>;
}

function readLessons(files: readonly LessonFile[], problems: ProblemList): ReadLesson[] {
  return files.flatMap((file) => {
    const sheet = readSheet(file, lessonFrontMatter, problems);
    return sheet ? [{ file, sheet }] : [];
  });
}

/** A lesson's number, unit, slug and file name must tell the same story as the course sheet. */
function checkPlace(
  { file, sheet }: ReadLesson,
  courses: readonly ReadCourse[],
  problems: ProblemList,
): void {
  const { number, slug, unit } = sheet.front;
  const [, place = ''] = number.split('.');
  const name = `${place.padStart(2, '0')}-${slug}.md`;
  if (!file.path.endsWith(`/${name}`)) {
    problems.add(file.path, sheet.lineOf('slug'), `the file must be called ${name}`);
  }
  const course = courses.find(({ file: { path } }) => path.endsWith(`${file.course}/course.md`));
  if (!course) {
    problems.add(file.path, 1, `there is no sound course.md in ${file.course}`);
    return;
  }
  const listed = course.compiled.units.find(({ sheets }) => sheets.includes(number));
  if (listed?.number === unit) return;
  const where = listed ? `under unit ${listed.number}` : 'under no unit';
  problems.add(
    file.path,
    sheet.lineOf('unit'),
    `unit ${unit} does not agree with ${course.file.path}, which lists sheet ${number} ${where}`,
  );
}

function checkPapers(
  blueprints: readonly Read<Blueprint>[],
  courses: readonly ReadCourse[],
  pool: { slug: string; subject: string }[],
  problems: ProblemList,
): void {
  for (const { file, value: blueprint } of blueprints) {
    if (!courses.some(({ compiled }) => compiled.slug === blueprint.course)) {
      problems.add(file.path, 1, `there is no course "${blueprint.course}"`);
    }
    try {
      assemblePaper(blueprint, pool, '00'.repeat(32));
    } catch (error) {
      if (!(error instanceof PoolTooSmall)) throw error;
      problems.add(file.path, 1, error.message);
    }
  }
}

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

/** Checks and compiles everything; each thing wrong goes to the list of problems. */
export function compileContent(sources: Sources, problems: ProblemList): CompiledContent {
  const questions = readEach(sources.questions, parseQuestion, problems);
  const blueprints = readEach(sources.blueprints, parseBlueprint, problems);
  const courses = sources.courses.flatMap((file) => readCourse(file, problems) ?? []);
  const lessons = readLessons(sources.lessons, problems);
  const named = questions.map(({ file, value }) => ({ file, value: value.meta.slug }));
  refuseRepeats('question', named, problems);
  refuseRepeats(
    'lesson',
    lessons.map(({ file, sheet }) => ({ file, value: sheet.front.slug })),
    problems,
  );
  const references: LessonReferences = {
    questions: new Map(questions.map(({ value }) => [value.meta.slug, value])),
    targets: {
      sheets: new Set(lessons.map(({ sheet }) => sheet.front.number)),
      worksheets: new Set(worksheetsOf(courses)),
      papers: new Set(blueprints.map(({ value }) => value.slug)),
    },
  };
  checkAgainstOthers({ courses, lessons, blueprints, questions }, references, problems);
  return {
    revisions: [
      ...questions.map(questionRevision),
      ...lessons.map(({ file, sheet }) => {
        const { compiled, hash } = compileLesson(file, sheet, references, problems);
        return lessonRevision(file, compiled, hash);
      }),
      ...courses.map(courseRevision),
      ...blueprints.map(blueprintRevision),
    ],
    schemes: blueprints.map(({ file, value }) => ({ path: file.path, scheme: value.scheme })),
  };
}

const worksheetsOf = (courses: readonly ReadCourse[]) =>
  courses.flatMap(({ compiled }) =>
    compiled.units.flatMap(({ worksheet }) => (worksheet ? [worksheet.number] : [])),
  );

interface ReadContent {
  readonly courses: readonly ReadCourse[];
  readonly lessons: readonly ReadLesson[];
  readonly blueprints: readonly Read<Blueprint>[];
  readonly questions: readonly Read<CompiledQuestion>[];
}

function checkAgainstOthers(
  { courses, lessons, blueprints, questions }: ReadContent,
  { targets }: LessonReferences,
  problems: ProblemList,
): void {
  const pools = new Map(questions.map(({ value: { meta } }) => [meta.slug, meta.pool]));
  for (const course of courses) {
    const own = lessons.filter(({ file }) => course.file.path.endsWith(`${file.course}/course.md`));
    const numbers = new Set(own.map(({ sheet }) => sheet.front.number));
    checkCourse(course, { lessons: numbers, pools, targets }, problems);
  }
  for (const lesson of lessons) checkPlace(lesson, courses, problems);
  const pool = questions.flatMap(({ value: { meta } }) => (meta.pool === 'paper' ? [meta] : []));
  checkPapers(blueprints, courses, pool, problems);
}
