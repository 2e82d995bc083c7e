import { createContext } from 'react';
import { type LessonView } from './queries.ts';

interface Kept extends Pick<LessonView, 'formulas' | 'figures' | 'worked'> {
  /** The paragraph the address names: it is marked. */
  named: number | null;
}

/** What stands beside the text and is looked up by it. */
export const LessonContext = createContext<Kept>({
  ...{ formulas: {}, figures: {}, worked: {} },
  named: null,
});
