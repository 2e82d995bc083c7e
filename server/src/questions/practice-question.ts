import type { QuestionMeta, QuestionTraits } from '@ferrule/assessments';

/** A question of the practice bank as lists show it. */
export type PracticeQuestion = Pick<
  QuestionMeta,
  'slug' | 'title' | 'subject' | 'level' | 'lesson' | 'marks'
> &
  QuestionTraits;
