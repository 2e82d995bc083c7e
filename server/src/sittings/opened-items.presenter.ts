import { presentQuestion, SUBJECTS } from '@ferrule/assessments';
import { localDay } from '../clock/local-day.ts';
import type { MarkedQuestion } from '../questions/question-view.ts';
import type { RecordedLook } from './looks.repository.ts';
import type { OpenedItems } from './papers.schemas.ts';
import { toAnswers, type Result } from './result.ts';
import { answersThatCount, type SavedAnswer, type Sitting } from './sitting.ts';
import { candidateName, type ShownItem } from './sitting.presenter.ts';

interface Opened {
  readonly items: readonly ShownItem[];
  readonly saved: readonly SavedAnswer[];
  readonly looks: readonly RecordedLook[];
  /** By the key of the question. */
  readonly marked: ReadonlyMap<string, MarkedQuestion>;
}

/** Questions, answers and marking of a paper, for a certification manager only. */
export function presentOpenedItems(sitting: Sitting, result: Result, opened: Opened): OpenedItems {
  const counted = answersThatCount(opened.saved);
  return {
    id: sitting.id,
    name: candidateName(sitting),
    satOn: localDay(sitting.startedAt, sitting.rules.scheme.zone),
    marks: result.marks,
    outOf: result.outOf,
    passed: result.passed,
    looks: opened.looks.map(({ at, by, reason }) => ({ at: at.toISOString(), by, reason })),
    items: opened.items.flatMap(({ item, question }) => {
      const marking = opened.marked.get(item.key);
      if (!marking) return [];
      return {
        number: item.number,
        subject: SUBJECTS[item.subject] ?? item.subject,
        question: presentQuestion(question, item.drawn),
        answers: toAnswers(counted.get(item.key)),
        marked: marking,
      };
    }),
  };
}
