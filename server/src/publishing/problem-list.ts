/** One thing that keeps content from being published. */
export interface ContentProblem {
  readonly path: string;
  readonly line: number;
  readonly message: string;
}

/** What a note is about, as the summary counts it. */
export const NOTE_SUBJECTS = {
  objectives: 'objectives short of questions',
  order: 'prerequisites not listed',
  sheets: 'sheets still to come',
  minutes: 'reading times that differ',
  sentences: 'sheets of long sentences',
  terms: 'terms in no glossary',
} as const;
export type NoteSubject = keyof typeof NOTE_SUBJECTS;

/** What an author may want to know. */
export interface ContentNote extends ContentProblem {
  readonly about: NoteSubject;
}

/** Gathers every problem, so that an author sees them all at once; what is only noted keeps nothing back. */
export class ProblemList {
  private readonly found: ContentProblem[] = [];
  private readonly noted: ContentNote[] = [];

  add(path: string, line: number, message: string): void {
    this.found.push({ path, line, message });
  }

  note(note: ContentNote): void {
    this.noted.push(note);
  }

  get isEmpty(): boolean {
    return this.found.length === 0;
  }

  /** In the order of files and lines. */
  sorted(): ContentProblem[] {
    return inOrder(this.found);
  }

  notes(): ContentNote[] {
    return inOrder(this.noted);
  }
}

const inOrder = <T extends ContentProblem>(list: readonly T[]): T[] =>
  [...list].sort((a, b) => a.path.localeCompare(b.path) || a.line - b.line);

/** Thrown when content is not in order: nothing was published. */
export class ContentNotInOrder extends Error {
  readonly problems: readonly ContentProblem[];

  constructor(problems: readonly ContentProblem[]) {
    super(problems.map(({ path, line, message }) => `${path}:${line}: ${message}`).join('\n'));
    this.name = 'ContentNotInOrder';
    this.problems = problems;
  }
}
