import { type BankQuestion, type BankView } from '../features/practice/queries.ts';
import { type PracticeView } from '../ui/question/practice.ts';
import { makeQuestion } from './questions.ts';

function makeBankQuestion(more: Partial<BankQuestion> = {}): BankQuestion {
  return {
    slug: 'vd-chart-table',
    title: 'Feeding the chart table',
    subject: { code: 'VD', name: 'Voltage drop' },
    level: 'apply',
    lesson: '3.4',
    marks: 4,
    kinds: ['quantity', 'choice'],
    readsCurve: false,
    profile: 'metric',
    tries: 0,
    best: null,
    ...more,
  };
}

/** Two of voltage drop, one shown; one of charging that has been tried. */
export function makeBank(): BankView {
  return {
    profile: 'metric',
    questions: [
      makeBankQuestion(),
      makeBankQuestion({
        slug: 'vd-deck-lamps',
        title: 'Lamps on deck',
        level: 'recall',
        tries: 2,
        best: { percent: 100, on: '2026-11-28' },
      }),
      makeBankQuestion({
        slug: 'cc-read-agm',
        title: 'Name the stage',
        subject: { code: 'CC', name: 'Charge stages and curves' },
        readsCurve: true,
        profile: 'awg',
        tries: 1,
        best: { percent: 50, on: '2026-11-20' },
      }),
    ],
  };
}

/** Part (a) is worked, part (b) is left: the last of two steps. */
export function makePractice(more: Partial<PracticeView> = {}): PracticeView {
  return {
    id: '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0e01',
    question: makeQuestion(),
    levels: [0, 1, 2],
    left: 1,
    shown: [
      {
        part: 'a',
        lines: [
          [
            { kind: 'number', text: '48.1' },
            { kind: 'unit', text: 'mΩ' },
          ],
        ],
      },
    ],
    asked: ['b'],
    ...more,
  };
}
