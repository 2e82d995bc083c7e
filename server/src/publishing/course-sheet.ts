import { z } from 'zod';
import type { CompiledCourse } from './compiled-course.ts';
import { readSheet, type Sheet } from './front-matter.ts';
import { parseText } from './markdown.ts';
import type { ProblemList } from './problem-list.ts';
import type { SourceFile } from './read-sources.ts';
import { day, language, lessonNumber, line, revision, slug } from './sheet-fields.ts';
import { checkText, type LinkTargets } from './text-checks.ts';

const isZone = (zone: string) => {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: zone }).format(0) !== '';
  } catch {
    return false;
  }
};

const courseFrontMatter = z.strictObject({
  number: line(20),
  slug,
  title: line(120),
  revision,
  issued: day,
  language,
  owner: line(120),
  /** How many sheets there will be: once they are all listed, the course is checked as a whole. */
  planned: z.number().int().min(1).max(200).optional(),
  zone: z.string().refine(isZone, 'a time zone such as Europe/London').default('Europe/London'),
  units: z
    .array(
      z.strictObject({
        number: z.number().int().min(1).max(99),
        title: line(120),
        sheets: z.array(lessonNumber).max(40),
        worksheet: z
          .strictObject({
            number: z.string().regex(/^W\d{1,2}$/, 'a worksheet number, such as W3'),
            title: line(120),
            questions: z.array(slug).min(1, 'name at least one question').max(20),
            passPercent: z.number().int().min(1).max(100),
          })
          .optional(),
      }),
    )
    .min(1)
    .max(40),
  paper: slug,
});
type CourseFrontMatter = z.infer<typeof courseFrontMatter>;

/** A course whose front matter is sound; what it refers to is checked later. */
export interface ReadCourse {
  readonly file: SourceFile;
  readonly sheet: Sheet<CourseFrontMatter>;
  readonly compiled: CompiledCourse;
}

export function readCourse(file: SourceFile, problems: ProblemList): ReadCourse | null {
  const sheet = readSheet(file, courseFrontMatter, problems);
  if (!sheet) return null;
  const units = sheet.front.units.map((unit) => ({ ...unit, worksheet: unit.worksheet ?? null }));
  return { file, sheet, compiled: { ...sheet.front, units, intro: sheet.body.trim() } };
}

/** Pool of each question; a sheet that could not be read is wrong already, whoever names it. */
export type Pools = ReadonlyMap<string, 'practice' | 'paper' | 'unread'>;

/** What a course sheet may refer to. */
export interface CourseReferences {
  /** Numbers of the lessons in the course's folder. */
  readonly lessons: ReadonlySet<string>;
  readonly pools: Pools;
  readonly targets: LinkTargets;
}

function complainOfRepeats(course: ReadCourse, problems: ProblemList): void {
  const { units } = course.compiled;
  const named = units.flatMap((unit, index) => [
    { name: `unit ${unit.number}`, line: course.sheet.lineOf('units', index, 'number') },
    ...unit.sheets.map((sheet, at) => ({
      name: `sheet ${sheet}`,
      line: course.sheet.lineOf('units', index, 'sheets', at),
    })),
    ...(unit.worksheet
      ? [
          {
            name: `worksheet ${unit.worksheet.number}`,
            line: course.sheet.lineOf('units', index, 'worksheet', 'number'),
          },
        ]
      : []),
  ]);
  const seen = new Set<string>();
  for (const { name, line: at } of named) {
    if (seen.has(name)) problems.add(course.file.path, at, `${name} is listed twice`);
    seen.add(name);
  }
}

/** Whether every sheet, question and paper that the course names is there. */
export function checkCourse(
  course: ReadCourse,
  references: CourseReferences,
  problems: ProblemList,
): void {
  const { file, sheet, compiled } = course;
  const complain = (at: number, message: string) => problems.add(file.path, at, message);
  compiled.units.forEach((unit, index) => {
    unit.sheets.forEach((number, at) => {
      if (references.lessons.has(number)) return;
      complain(sheet.lineOf('units', index, 'sheets', at), `there is no lesson ${number}`);
    });
    unit.worksheet?.questions.forEach((question, at) => {
      const reason = whyNotPractice(question, references.pools);
      if (reason) complain(sheet.lineOf('units', index, 'worksheet', 'questions', at), reason);
    });
  });
  if (!references.targets.papers.has(compiled.paper)) {
    complain(sheet.lineOf('paper'), `there is no paper "${compiled.paper}"`);
  }
  complainOfRepeats(course, problems);
  checkText(parseText(sheet.body), references.targets, (node, message) =>
    complain((node.position?.start.line ?? 1) + sheet.bodyLine - 1, message),
  );
}

/** Why a question may not be shown for practice; null when it may. */
export function whyNotPractice(question: string, pools: Pools): string | null {
  const pool = pools.get(question);
  if (pool === undefined)
    return `unknown question "${question}": there is no such sheet in the bank`;
  if (pool === 'paper') {
    return `question "${question}" is of the paper pool: only practice questions may be shown here`;
  }
  return null;
}
