/** An error as the server writes it (RFC 9457), with the extensions it declares. */
export interface Problem {
  type: string;
  title: string;
  status: number;
  detail?: string;
  instance?: string;
  errors?: { pointer: string; detail: string }[];
  retryAfterSeconds?: number;
  [extension: string]: unknown;
}

/** A request the server refused, or one that got no answer. */
export class ProblemError extends Error {
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.title);
    this.name = 'ProblemError';
    this.problem = problem;
  }
}

const noAnswer: Problem = {
  type: '/problems/no-answer',
  title: 'The server did not answer',
  status: 0,
  detail: 'Nothing was lost. Check the signal and try again.',
};

/** True for a refusal of this kind: `isProblem(error, 'sitting-closed')`. */
export function isProblem(error: unknown, slug: string): error is ProblemError {
  return error instanceof ProblemError && error.problem.type === `/problems/${slug}`;
}

export function toProblem(body: unknown, status: number): ProblemError {
  if (isProblemBody(body)) return new ProblemError(body);
  return new ProblemError({
    type: 'about:blank',
    title: 'Something went wrong on our side',
    status,
    detail: 'It has been noted. Nothing already saved is lost. Try again in a moment.',
  });
}

export function noAnswerProblem(): ProblemError {
  return new ProblemError(noAnswer);
}

function isProblemBody(body: unknown): body is Problem {
  return typeof body === 'object' && body !== null && 'type' in body && 'title' in body;
}

interface Said {
  title: string;
  detail: string;
  /** The page that says what to do about this kind of problem. */
  page: string | null;
}

/** A problem in words for a person. */
export function sayProblem(error: unknown): Said {
  const { problem } = error instanceof ProblemError ? error : toProblem(null, 0);
  const detail = problem.detail ?? problem.errors?.map((wrong) => wrong.detail).join(' ') ?? '';
  return {
    title: problem.title,
    detail: sayWait(problem) ?? detail,
    page: problemPage(problem),
  };
}

function sayWait({ retryAfterSeconds }: Problem): string | null {
  if (!retryAfterSeconds) return null;
  if (retryAfterSeconds < 90) return `Try again in ${retryAfterSeconds} seconds.`;
  return `Try again in ${Math.ceil(retryAfterSeconds / 60)} minutes.`;
}

function problemPage({ type, status }: Problem): string | null {
  return type.startsWith('/problems/') && status !== 0 && status !== 422 ? type : null;
}

/** Field errors by field name: "#/email" belongs to `email`. */
export function fieldProblems(error: unknown): Record<string, string> {
  if (!(error instanceof ProblemError)) return {};
  const errors = error.problem.errors ?? [];
  return Object.fromEntries(
    errors.map(({ pointer, detail }) => [pointer.replace(/^#?\//, ''), detail]),
  );
}
