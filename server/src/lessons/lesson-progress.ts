/** How far one person has come with one sheet. */
export interface LessonProgress {
  readonly accountId: string;
  readonly lesson: string;
  readonly paragraph: number;
  readonly begunAt: Date;
  readonly lastReadAt: Date;
  readonly doneAt: Date | null;
  /** The revision that was marked done. */
  readonly doneRevision: string | null;
}

export type SheetState = 'not-begun' | 'begun' | 'done';

/** A sheet once marked done stays done; a newer revision is told beside it. */
export function stateOf(progress: LessonProgress | undefined): SheetState {
  if (!progress) return 'not-begun';
  return progress.doneAt ? 'done' : 'begun';
}

/** Which revision was read and which is out now, when they differ. */
export function revisedSince(
  progress: LessonProgress | undefined,
  current: string,
): { from: string; to: string } | null {
  const from = progress?.doneRevision ?? null;
  return from === null || from === current ? null : { from, to: current };
}
