import type { Blueprint, CompiledQuestion } from '@ferrule/assessments';
import type { CompiledCourse } from './compiled-course.ts';
import type { CompiledGlossary } from './compiled-glossary.ts';
import type { CompiledLesson } from './compiled-lesson.ts';

/** What the compiled form of each kind of published content is. */
export interface ContentByKind {
  course: CompiledCourse;
  lesson: CompiledLesson;
  question: CompiledQuestion;
  blueprint: Blueprint;
  glossary: CompiledGlossary;
}

export type ContentKind = keyof ContentByKind;

/** One published revision without its contents. */
export interface Listing {
  readonly id: string;
  readonly kind: ContentKind;
  readonly slug: string;
  readonly revision: string;
  readonly hash: string;
  readonly pool: 'practice' | 'paper' | null;
  readonly subject: string | null;
  /** The number of a lesson, or the lesson a question belongs to. */
  readonly lesson: string | null;
}

/** One published revision with its contents. */
export interface Published<K extends ContentKind> extends Listing {
  readonly content: ContentByKind[K];
}
