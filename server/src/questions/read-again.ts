import type { MarkedPart, MarkedQuestion as LibraryMarkedQuestion } from '@ferrule/assessments';
import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import { headingsOf } from '../publishing/lesson-headings.ts';
import type { MarkedQuestion, ReadAgain } from './question-view.ts';

type Lesson = Pick<CompiledLesson, 'number' | 'title' | 'headings' | 'body'>;

/** A sheet, and the paragraph of it where the heading still stands. */
function placeReading(
  sheet: string,
  lesson: Lesson | undefined,
  heading: string | null,
): ReadAgain {
  const found = lesson && headingsOf(lesson).find(({ text }) => text === heading?.trim());
  return {
    sheet,
    title: lesson?.title ?? null,
    heading: found?.text ?? null,
    paragraph: found?.paragraph ?? null,
    issued: lesson !== undefined,
  };
}

/** Markings kept before the wrong step was told lack it. */
type StoredPart = Omit<MarkedPart, 'read' | 'wrongStep'> &
  Partial<Pick<MarkedPart, 'read' | 'wrongStep'>>;

/** A marked question with what to read after each answer that lost marks. */
export function showMarked(
  marked: LibraryMarkedQuestion,
  sheet: string,
  lesson: Lesson | undefined,
): MarkedQuestion {
  return {
    ...marked,
    parts: marked.parts.map((part) => {
      const { wrongStep = null, read = null }: StoredPart = part;
      const isShort = part.marks < part.outOf;
      return { ...part, wrongStep, read: isShort ? placeReading(sheet, lesson, read) : null };
    }),
  };
}
