/** A worksheet as the course sheet lists it. */
export interface CourseWorksheet {
  readonly number: string;
  readonly title: string;
  readonly questions: readonly string[];
  readonly passPercent: number;
}

export interface CourseUnit {
  readonly number: number;
  readonly title: string;
  /** Issued lessons by number; empty when the unit is not yet issued. */
  readonly sheets: readonly string[];
  readonly worksheet: CourseWorksheet | null;
}

/** The course sheet as published. */
export interface CompiledCourse {
  readonly number: string;
  readonly slug: string;
  readonly title: string;
  readonly revision: string;
  readonly issued: string;
  readonly language: string;
  readonly owner: string;
  /** Where the school's days begin and end. */
  readonly zone: string;
  readonly units: readonly CourseUnit[];
  readonly paper: string;
  /** How many sheets the course will have; missing where nobody said. */
  readonly planned?: number | undefined;
  /** Markdown. */
  readonly intro: string;
}
