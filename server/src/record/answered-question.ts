/** One question a person answered, on a worksheet or in practice. */
export interface AnsweredQuestion {
  readonly slug: string;
  readonly at: Date;
  /** Calendar day, YYYY-MM-DD. */
  readonly day: string;
  readonly percent: number;
  /** Asked whole, with no step worked beforehand. */
  readonly isWhole: boolean;
  readonly isHinted: boolean;
}

/** Of the marks, from which a question counts as shown. */
const SHOWN_PERCENT = 80;

/** Answered by oneself: whole and without a hint. */
const isUnaided = ({ isWhole, isHinted }: AnsweredQuestion): boolean => isWhole && !isHinted;

export const isRight = ({ percent }: AnsweredQuestion): boolean => percent >= SHOWN_PERCENT;

/** Whether the answer shows that the person can do it. */
export const isShown = (answered: AnsweredQuestion): boolean =>
  isUnaided(answered) && isRight(answered);

/** The best unaided answer, the earliest of equals. */
export function bestOf(answers: readonly AnsweredQuestion[]): AnsweredQuestion | null {
  const [best] = answers
    .filter(isUnaided)
    .sort((a, b) => b.percent - a.percent || a.at.getTime() - b.at.getTime());
  return best ?? null;
}

export function bySlug(answers: readonly AnsweredQuestion[]): Map<string, AnsweredQuestion[]> {
  const groups = new Map<string, AnsweredQuestion[]>();
  for (const answered of answers) {
    const group = groups.get(answered.slug);
    if (group) group.push(answered);
    else groups.set(answered.slug, [answered]);
  }
  return groups;
}
