import { type MarkedQuestionView, type QuestionView } from '../ui/question/views.ts';

/** Two parts: a resistance to work out, a cable to choose. */
export function makeQuestion(more: Partial<QuestionView> = {}): QuestionView {
  return {
    title: 'Feeding the chart table',
    lead: 'A cable feeds a chart table.',
    body: '',
    subject: 'VD',
    profile: 'metric',
    marks: 4,
    aids: ['Calculator'],
    given: [{ symbol: 'I', label: 'Load current', value: '14.0', unit: 'A' }],
    tables: [],
    diagram: null,
    curve: null,
    cautions: [],
    parts: [
      {
        id: 'a',
        kind: 'quantity',
        prompt: 'Find the resistance of the pair.',
        marks: 2,
        symbol: 'R',
        units: ['mΩ', 'Ω'],
        rounding: null,
        options: [],
        rows: [],
        layout: 'rows',
      },
      {
        id: 'b',
        kind: 'choice',
        prompt: 'Choose the cable.',
        marks: 2,
        symbol: null,
        units: [],
        rounding: null,
        options: [
          { id: 'o1', text: '4 mm²' },
          { id: 'o2', text: '10 mm²' },
        ],
        rows: [],
        layout: 'sizes',
      },
    ],
    ...more,
  };
}

/** One slip in (a). */
export function makeMarked(more: Partial<MarkedQuestionView> = {}): MarkedQuestionView {
  return {
    markerVersion: 1,
    marks: 1,
    outOf: 2,
    summary: 'One slip: you counted the cable out but not back.',
    parts: [
      {
        id: 'a',
        prompt: 'Find the resistance of the pair.',
        verdict: 'slip',
        marks: 1,
        outOf: 2,
        yours: [
          [
            { kind: 'number', text: '24.1' },
            { kind: 'unit', text: 'mΩ' },
          ],
        ],
        worked: [
          [
            { kind: 'number', text: '48.1', differs: true },
            { kind: 'unit', text: 'mΩ' },
          ],
        ],
        remarks: [{ sign: 'lost', heading: null, text: 'out and back, 2 × 5.5 m' }],
        wrongStep: null,
        read: null,
      },
    ],
    trace: [],
    ...more,
  };
}
