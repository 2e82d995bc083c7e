import { localDay } from '../clock/local-day.ts';
import { currentSheet } from '../lessons/current-sheet.ts';
import { revisedSince, stateOf, type LessonProgress } from '../lessons/lesson-progress.ts';
import type { CompiledCourse, CourseUnit } from '../publishing/compiled-course.ts';
import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import { bestOf, isLit } from '../worksheets/score.ts';
import type { AttemptSummary } from '../worksheets/worksheet-attempt.ts';
import type { CourseMap } from './courses.schemas.ts';

/** What the map of one person is drawn from. */
export interface MapRecords {
  readonly course: CompiledCourse;
  readonly lessons: ReadonlyMap<string, CompiledLesson>;
  readonly progress: ReadonlyMap<string, LessonProgress>;
  readonly attempts: readonly AttemptSummary[];
}

type MapUnit = CourseMap['units'][number];

function sheetOf(number: string, records: MapRecords): MapUnit['sheets'] {
  const lesson = records.lessons.get(number);
  if (!lesson) return [];
  const progress = records.progress.get(number);
  const doneAt = progress?.doneAt ?? null;
  return [
    {
      number,
      slug: lesson.slug,
      title: lesson.title,
      state: stateOf(progress),
      revised: revisedSince(progress, lesson.revision),
      paragraph: progress?.paragraph ?? null,
      doneOn: doneAt && localDay(doneAt, records.course.zone),
    },
  ];
}

function worksheetOf({ worksheet }: CourseUnit, records: MapRecords): MapUnit['worksheet'] {
  if (!worksheet) return null;
  const { number, title, passPercent, questions } = worksheet;
  const attempts = records.attempts.filter((attempt) => attempt.worksheet === number);
  const best = bestOf(attempts);
  return {
    ...{ number, title, passPercent },
    questions: questions.length,
    best: best && { ...best, on: localDay(best.on, records.course.zone) },
    lit: isLit(best, passPercent),
    attempts: attempts.filter(({ handedInAt }) => handedInAt !== null).length,
    openAttemptId: attempts.find(({ handedInAt }) => handedInAt === null)?.id ?? null,
  };
}

export function unitsOf(records: MapRecords): MapUnit[] {
  return records.course.units.map((unit) => ({
    number: unit.number,
    title: unit.title,
    issued: unit.sheets.length > 0,
    sheets: unit.sheets.flatMap((number) => sheetOf(number, records)),
    worksheet: worksheetOf(unit, records),
  }));
}

/** The sheet to go on with, and how much of it is left. */
export function carryOnOf({ course, lessons, progress }: MapRecords): CourseMap['carryOn'] {
  const sheets = course.units.flatMap((unit) => unit.sheets);
  const current = currentSheet(sheets, progress);
  const lesson = current && lessons.get(current.number);
  if (!lesson) return null;
  const of = Math.max(1, lesson.paragraphs);
  const paragraph = Math.min(of, current.begun?.paragraph ?? 1);
  const minutesLeft = Math.max(1, Math.round((lesson.minutes * (of - paragraph + 1)) / of));
  return { sheet: lesson.number, title: lesson.title, paragraph, of, minutesLeft };
}
