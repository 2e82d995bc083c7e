import { createContext } from 'react';
import { type LessonView } from './queries.ts';

interface Kept extends Pick<
  LessonView,
  'formulas' | 'figures' | 'drawings' | 'worked' | 'terms' | 'tries'
> {
  /** The paragraph the address names: it is marked. */
  named: number | null;
}

/** What stands beside the text and is looked up by it. */
export const LessonContext = createContext<Kept>({
  ...{ formulas: {}, figures: {}, drawings: {}, worked: {}, terms: [], tries: [] },
  named: null,
});
