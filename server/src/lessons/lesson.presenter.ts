import { createHash } from 'node:crypto';
import type { CompiledCourse, CourseUnit } from '../publishing/compiled-course.ts';
import type { Published } from '../publishing/content.ts';
import type { LessonView } from './lessons.schemas.ts';

/** Raised when the shape of the view changes, so that no browser keeps the old one. */
const VIEW_VERSION = 1;

type Lesson = Published<'lesson'>;

/** A lesson with its place in the course. */
export interface PlacedLesson {
  readonly lesson: Lesson;
  readonly unit: CourseUnit;
  readonly course: Published<'course'>;
  readonly previous: Lesson | null;
  readonly next: Lesson | null;
}

/** Finds a sheet and its neighbours in the order of the course; null when it is not on it. */
export function placeLesson(
  number: string,
  lessons: readonly Lesson[],
  course: Published<'course'>,
): PlacedLesson | null {
  const byNumber = new Map(lessons.map((lesson) => [lesson.content.number, lesson]));
  const order = sheetsInOrder(course.content);
  const at = order.indexOf(number);
  const unit = course.content.units.find(({ sheets }) => sheets.includes(number));
  const lesson = byNumber.get(number);
  if (!unit || !lesson) return null;
  const neighbour = (index: number) => byNumber.get(order[index] ?? '') ?? null;
  return { lesson, unit, course, previous: neighbour(at - 1), next: neighbour(at + 1) };
}

const sheetsInOrder = (course: CompiledCourse) => course.units.flatMap(({ sheets }) => sheets);

const reference = (lesson: Lesson | null) =>
  lesson && { number: lesson.content.number, title: lesson.content.title };

export function presentLesson({ lesson, unit, previous, next }: PlacedLesson): LessonView {
  const { content } = lesson;
  return {
    ...content,
    unit: { number: unit.number, title: unit.title },
    can: [...content.can],
    words: [...content.words],
    sources: [...content.sources],
    recall: [...content.recall],
    tries: [...content.tries],
    formulas: { ...content.formulas },
    figures: { ...content.figures },
    worked: { ...content.worked },
    previous: reference(previous),
    next: reference(next),
  };
}

/** Changes with anything the view shows. */
export function etagOf({ lesson, course, previous, next }: PlacedLesson): string {
  const parts = [lesson, course, previous, next].map((item) => item?.id ?? '-');
  const hash = createHash('sha256')
    .update([VIEW_VERSION, ...parts].join('|'))
    .digest('base64url');
  return `"${hash.slice(0, 22)}"`;
}

/** Whether a browser's If-None-Match holds the tag; a proxy may have weakened it on the way. */
export const holdsTag = (ifNoneMatch: string | undefined, etag: string): boolean =>
  (ifNoneMatch ?? '').split(',').some((tag) => tag.trim().replace(/^W\//, '') === etag);
