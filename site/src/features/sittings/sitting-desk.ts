import { useOutletContext } from 'react-router-dom';
import { type Standing } from '../../ui/question/views.ts';
import { type AnswerDesk, type DeskState } from './answer-desk.ts';
import { type SittingView } from './queries.ts';

/** What the question pages and the review share: one desk, so that neither is behind the other. */
export interface SittingDesk {
  sitting: SittingView;
  desk: AnswerDesk;
  state: DeskState;
  standings: Standing[];
  pennants: Record<string, boolean>;
  setPennant: (key: string, comeBack: boolean) => void;
  isOver: boolean;
  takeOver: () => void;
  isTakingOver: boolean;
}

export const useSittingDesk = () => useOutletContext<SittingDesk>();
