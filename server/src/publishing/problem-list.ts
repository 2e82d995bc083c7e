/** One thing that keeps content from being published. */
export interface ContentProblem {
  readonly path: string;
  readonly line: number;
  readonly message: string;
}

/** Gathers every problem, so that an author sees them all at once. */
export class ProblemList {
  private readonly found: ContentProblem[] = [];

  add(path: string, line: number, message: string): void {
    this.found.push({ path, line, message });
  }

  get isEmpty(): boolean {
    return this.found.length === 0;
  }

  /** In the order of files and lines. */
  sorted(): ContentProblem[] {
    return [...this.found].sort((a, b) => a.path.localeCompare(b.path) || a.line - b.line);
  }
}

/** Thrown when content is not in order: nothing was published. */
export class ContentNotInOrder extends Error {
  readonly problems: readonly ContentProblem[];

  constructor(problems: readonly ContentProblem[]) {
    super(problems.map(({ path, line, message }) => `${path}:${line}: ${message}`).join('\n'));
    this.name = 'ContentNotInOrder';
    this.problems = problems;
  }
}
