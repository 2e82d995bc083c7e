/** A term as the glossary of a course lists it. */
export interface GlossaryWord {
  readonly term: string;
  readonly means: string;
  /** Other forms it goes by. */
  readonly also: readonly string[];
  /** Number of the sheet that explains it. */
  readonly sheet: string | null;
}

/** The glossary as published; lessons have words of their own beside it. */
export interface CompiledGlossary {
  /** That of its course. */
  readonly slug: string;
  readonly revision: string;
  readonly issued: string;
  readonly language: string;
  readonly words: readonly GlossaryWord[];
}
