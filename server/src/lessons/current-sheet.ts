import type { LessonProgress } from './lesson-progress.ts';

/** Where a person is: on a sheet they began, or before the first they did not. */
export interface CurrentSheet {
  readonly number: string;
  /** Null when the sheet has not been begun. */
  readonly begun: LessonProgress | null;
}

/** Of several begun sheets, the one read last; null when every sheet is done. */
export function currentSheet(
  sheets: readonly string[],
  progress: ReadonlyMap<string, LessonProgress>,
): CurrentSheet | null {
  const [begun] = sheets
    .flatMap((number) => progress.get(number) ?? [])
    .filter(({ doneAt }) => doneAt === null)
    .sort((a, b) => b.lastReadAt.getTime() - a.lastReadAt.getTime());
  if (begun) return { number: begun.lesson, begun };
  const next = sheets.find((number) => !progress.has(number));
  return next === undefined ? null : { number: next, begun: null };
}
