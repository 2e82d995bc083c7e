import { assemblePaper, PoolTooSmall } from '@ferrule/assessments';
import { checkReadings } from './check-readings.ts';
import { checkWhole } from './check-whole.ts';
import { checkWords } from './check-words.ts';
import { checkCourse, type Pools, type ReadCourse } from './course-sheet.ts';
import type { ProblemList } from './problem-list.ts';
import type { Read, ReadContent, ReadLesson } from './read-content.ts';
import type { LinkTargets } from './text-checks.ts';

function refuseRepeats(kind: string, read: readonly Read<string>[], problems: ProblemList): void {
  const first = new Map<string, string>();
  for (const { file, value: slug } of read) {
    const other = first.get(slug);
    if (other === undefined) first.set(slug, file.path);
    else problems.add(file.path, 1, `${kind} "${slug}" is already the name of ${other}`);
  }
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

function checkPapers({ blueprints, courses }: ReadContent, problems: ProblemList): void {
  for (const { file, value: blueprint } of blueprints) {
    if (courses.some(({ compiled }) => compiled.slug === blueprint.course)) continue;
    problems.add(file.path, 1, `there is no course "${blueprint.course}"`);
  }
}

/** Whether the paper questions among the sheets are enough for each paper. */
export function checkPaperPool(content: ReadContent, problems: ProblemList): void {
  const { blueprints, questions, unread } = content;
  if (unread.questions.length > 0) return;
  const pool = questions.flatMap(({ value: { meta } }) => (meta.pool === 'paper' ? [meta] : []));
  for (const { file, value: blueprint } of blueprints) {
    try {
      assemblePaper(blueprint, pool, '00'.repeat(32));
    } catch (error) {
      if (!(error instanceof PoolTooSmall)) throw error;
      problems.add(file.path, 1, error.message);
    }
  }
}

function checkCourses(
  { courses, lessons, unread }: ReadContent,
  references: { pools: Pools; targets: LinkTargets },
  problems: ProblemList,
): void {
  for (const course of courses) {
    const own = lessons.filter(({ file }) => course.file.path.endsWith(`${file.course}/course.md`));
    const numbers = new Set(own.map(({ sheet }) => sheet.front.number));
    const known = unread.lessons ? references.targets.sheets : numbers;
    checkCourse(course, { lessons: known, ...references }, problems);
  }
}

/** Whether the sheets agree with each other. */
export function checkContent(
  content: ReadContent,
  references: { pools: Pools; targets: LinkTargets },
  problems: ProblemList,
): void {
  const { courses, lessons, questions } = content;
  const named = (name: (lesson: ReadLesson) => string) =>
    lessons.map((lesson) => ({ file: lesson.file, value: name(lesson) }));
  refuseRepeats(
    'question',
    questions.map(({ file, value }) => ({ file, value: value.meta.slug })),
    problems,
  );
  refuseRepeats(
    'lesson',
    named(({ sheet }) => sheet.front.slug),
    problems,
  );
  refuseRepeats(
    'sheet',
    named(({ sheet }) => sheet.front.number),
    problems,
  );
  checkCourses(content, references, problems);
  for (const lesson of lessons) checkPlace(lesson, courses, problems);
  checkPapers(content, problems);
  checkReadings(content, problems);
  checkWords(content, problems);
  checkWhole(content, problems);
}
