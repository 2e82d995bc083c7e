import type { DrawingData, DrawingKind, WorkedAnswer } from '@ferrule/assessments';

/** A hast root, plain JSON. */
export interface Tree {
  readonly type: 'root';
  readonly children: unknown[];
}

export interface CompiledFigure {
  readonly tree: Tree;
  readonly narrow: Tree | null;
  readonly short: string;
  /** Markdown. */
  readonly long: string;
}

/** What a reader can do afterwards, and what asks for it. */
export interface CompiledObjective {
  readonly does: string;
  /** Practice questions by slug. */
  readonly questions: readonly string[];
  /** Recall questions of the sheet, the first is 1. */
  readonly recall: readonly number[];
}

export interface LessonHeading {
  readonly text: string;
  /** Number of the first paragraph under it. */
  readonly paragraph: number;
}

/** A lesson sheet as published: all that is drawn from it, nothing left to look up. */
export interface CompiledLesson {
  readonly number: string;
  readonly slug: string;
  readonly title: string;
  readonly revision: string;
  readonly issued: string;
  readonly language: string;
  readonly unit: number;
  readonly subject: string;
  readonly level: string;
  readonly pool: 'practice';
  readonly author: string;
  readonly checkedBy: string;
  readonly minutes: number;
  readonly lead: string;
  readonly can: readonly string[];
  /** Missing in lessons stored before it was kept. */
  readonly objectives?: readonly CompiledObjective[];
  /** Sheets to read before this one; missing in lessons stored before it was kept. */
  readonly needs?: readonly string[];
  readonly words: readonly { readonly term: string; readonly meaning: string }[];
  readonly sources: readonly string[];
  readonly cautions: readonly string[];
  readonly recall: readonly { readonly ask: string; readonly answer: string }[];
  /** Markdown. */
  readonly body: string;
  readonly paragraphs: number;
  /** Missing in lessons stored before it was kept. */
  readonly headings?: readonly LessonHeading[];
  readonly formulas: Readonly<Record<string, Tree>>;
  readonly figures: Readonly<Record<string, CompiledFigure>>;
  /** Data of the drawings to handle; missing in lessons stored before there were any. */
  readonly drawings?: Readonly<Partial<Record<DrawingKind, DrawingData>>>;
  readonly worked: Readonly<Record<string, WorkedAnswer>>;
  readonly tries: readonly string[];
}
