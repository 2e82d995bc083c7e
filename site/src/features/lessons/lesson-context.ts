import { createContext } from 'react';
import { type LessonView } from './queries.ts';

type Kept = Pick<LessonView, 'formulas' | 'figures' | 'worked'>;

/** What stands beside the text and is looked up by it. */
export const LessonContext = createContext<Kept>({ formulas: {}, figures: {}, worked: {} });
