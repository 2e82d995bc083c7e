import { type PaperView } from '../features/papers/queries.ts';
import { type ResultView } from '../features/results/queries.ts';
import { type SittingItem, type SittingView } from '../features/sittings/queries.ts';
import { makeQuestion } from './questions.ts';

export const sittingId = '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0a01';
export const certificateId = '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0c01';

export function makeItem(number: number, more: Partial<SittingItem> = {}): SittingItem {
  return {
    key: `k${number}`,
    number,
    subject: 'Voltage drop',
    question: makeQuestion({ title: `Run ${number}` }),
    answers: {},
    comeBack: false,
    ...more,
  };
}

/** A paper of two questions, opened a quarter of an hour ago. */
export function makeSitting(more: Partial<SittingView> = {}): SittingView {
  const now = Date.now();
  const minute = 60_000;
  return {
    id: sittingId,
    paper: {
      slug: 'final-paper',
      number: 'F1',
      title: 'Final paper',
      sat: 'unsupervised, on the candidate’s own device',
      aids: ['A calculator'],
    },
    name: 'Ifeoma Castellan',
    startedAt: new Date(now - 15 * minute).toISOString(),
    closesAt: new Date(now + 45 * minute).toISOString(),
    now: new Date(now).toISOString(),
    minutes: 60,
    marks: 8,
    passPercent: 70,
    state: 'open',
    handedInAt: null,
    handedInHow: null,
    resultReady: false,
    readOnly: false,
    items: [makeItem(1), makeItem(2)],
    receipts: [],
    ...more,
  };
}

export function makePaper(standing: Partial<PaperView['standing']> = {}): PaperView {
  return {
    slug: 'final-paper',
    number: 'F1',
    title: 'Final paper',
    minutes: 60,
    extraTimePercent: 0,
    questions: 6,
    marks: 36,
    passPercent: 70,
    waitDays: 14,
    sat: 'unsupervised, on the candidate’s own device',
    aids: ['A calculator'],
    agreement: 'The work is my own.',
    agreementHash: 'a1b2',
    scheme: {
      title: 'Auxiliary DC systems installer',
      revision: 'A',
      scope: ['Find the voltage drop of a cable run'],
      limits: ['No practical work was assessed'],
      validYears: 3,
    },
    appeal: 'Appeal within ten working days.',
    standing: {
      state: 'open',
      reasons: [],
      mayStartAt: null,
      sittingId: null,
      certificateId: null,
      sittings: [],
      ...standing,
    },
  };
}

/** Three marks short of 26 of 36, most of them on charging. */
export function makeResult(more: Partial<ResultView> = {}): ResultView {
  const practise = (sheet: string, title: string, worksheet: string) => ({
    sheet,
    title,
    worksheet,
  });
  return {
    id: sittingId,
    paper: { slug: 'final-paper', number: 'F1', title: 'Final paper' },
    name: 'Ifeoma Castellan',
    satOn: '2026-12-01',
    handedInHow: 'by-candidate',
    markedAt: '2026-12-01T10:45:20Z',
    marks: 23,
    outOf: 36,
    percent: 63,
    passPercent: 70,
    passMarks: 26,
    passed: false,
    bySubject: [
      {
        subject: 'VD',
        name: 'Voltage drop',
        marks: 13,
        outOf: 14,
        practise: practise('3.4', 'The long run', 'W3'),
      },
      { subject: 'RD', name: 'Rating and derating', marks: 10, outOf: 10, practise: null },
      {
        subject: 'CC',
        name: 'Battery charging',
        marks: 0,
        outOf: 12,
        practise: practise('5.6', 'Charge stages on a curve', 'W5'),
      },
    ],
    maySitAgainAt: '2026-12-15T10:00:00Z',
    appeal: 'Appeal within ten working days.',
    certificate: null,
    ...more,
  };
}
