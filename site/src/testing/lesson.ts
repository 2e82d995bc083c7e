import { type Answer } from '../api/views.ts';

type LessonView = Answer<'Lessons_read'>;

/** Sheet 3.4, with two paragraphs and a question to try. */
export function makeLesson(more: Partial<LessonView> = {}): LessonView {
  return {
    number: '3.4',
    slug: 'the-long-run',
    title: 'The long run',
    revision: 'C',
    issued: '2026-11-02',
    language: 'en',
    unit: { number: 3, title: 'Voltage drop' },
    author: 'O. Marchetti',
    checkedBy: 'R. Nakamura',
    minutes: 14,
    lead: 'Both conductors cost you volts.',
    can: ['size a two-wire run'],
    objectives: [{ does: 'size a two-wire run', questions: ['vd-chart-table'], recall: [1] }],
    needs: [],
    headings: [],
    terms: [],
    drawings: {},
    body: 'Stand at the fuse board.\n\nA conductor is a resistor.\n\n::try{question="vd-chart-table"}',
    paragraphs: 2,
    words: [],
    sources: ['IEC 60228:2004 (from memory)'],
    recall: [{ ask: 'Why twice?', answer: 'Out and back.' }],
    formulas: {},
    figures: {},
    worked: {},
    tries: ['vd-chart-table'],
    previous: { number: '1.4', title: 'Isolate, lock, prove dead' },
    next: null,
    ...more,
  };
}
