import { createHash } from 'node:crypto';
import type { Term } from '../glossary/terms.ts';
import type { CompiledCourse, CourseUnit } from '../publishing/compiled-course.ts';
import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import type { Published } from '../publishing/content.ts';
import { headingsOf } from '../publishing/lesson-headings.ts';
import type { LessonView } from './lessons.schemas.ts';

/** Raised when the shape of the view changes, so that no browser keeps the old one. */
const VIEW_VERSION = 2;

type Lesson = Published<'lesson'>;

/** A lesson with its place in the course. */
export interface PlacedLesson {
  readonly lesson: Lesson;
  readonly unit: CourseUnit;
  readonly course: Published<'course'>;
  readonly previous: Lesson | null;
  readonly next: Lesson | null;
  /** Sheets to read before it. */
  readonly needs: readonly Lesson[];
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
  const needs = (lesson.content.needs ?? []).flatMap((need) => byNumber.get(need) ?? []);
  return { lesson, unit, course, needs, previous: neighbour(at - 1), next: neighbour(at + 1) };
}

const sheetsInOrder = (course: CompiledCourse) => course.units.flatMap(({ sheets }) => sheets);

const referenceTo = ({ content: { number, title } }: Lesson) => ({ number, title });
const reference = (lesson: Lesson | null) => lesson && referenceTo(lesson);

/** A lesson stored before questions were named with what it teaches has none to name. */
const objectivesOf = ({ can, objectives }: CompiledLesson): LessonView['objectives'] =>
  (objectives ?? can.map((does) => ({ does, questions: [], recall: [] }))).map((objective) => ({
    does: objective.does,
    questions: [...objective.questions],
    recall: [...objective.recall],
  }));

/** @param terms - those of the glossary that the lesson uses. */
export function presentLesson(placed: PlacedLesson, terms: readonly Term[]): LessonView {
  const { lesson, unit, previous, next, needs } = placed;
  const { content } = lesson;
  return {
    ...content,
    unit: { number: unit.number, title: unit.title },
    can: [...content.can],
    objectives: objectivesOf(content),
    needs: needs.map(referenceTo),
    headings: headingsOf(content).map((heading) => ({ ...heading })),
    terms: terms.map(({ term, means, also }) => ({ term, means, forms: [term, ...also] })),
    drawings: { ...content.drawings } as LessonView['drawings'],
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
export function etagOf(placed: PlacedLesson, terms: readonly Term[]): string {
  const { lesson, course, previous, next, needs } = placed;
  const parts = [lesson, course, previous, next, ...needs].map((item) => item?.id ?? '-');
  const hash = createHash('sha256')
    .update([VIEW_VERSION, ...parts, JSON.stringify(terms)].join('|'))
    .digest('base64url');
  return `"${hash.slice(0, 22)}"`;
}

/** Whether a browser's If-None-Match holds the tag; a proxy may have weakened it on the way. */
export const holdsTag = (ifNoneMatch: string | undefined, etag: string): boolean =>
  (ifNoneMatch ?? '').split(',').some((tag) => tag.trim().replace(/^W\//, '') === etag);
