import type { LetterTemplate } from '../letter.ts';

const sat = {
  needs: [
    'givenName',
    'paperNumber',
    'paperTitle',
    'satOn',
    'marks',
    'outOf',
    'percent',
    'passPercent',
    'url',
  ],
  subject: 'Your result: {{ paperTitle }}',
  kicker: '{{ paperTitle }}',
  facts: [
    ['Paper', '{{ paperNumber }}'],
    ['Sat', '{{ satOn }}'],
    ['Pass mark', '{{ passPercent }} %'],
  ],
  table: {
    title: 'Where the marks went',
    lines: 'bySubject',
    total: ['In all', '{{ marks }} of {{ outOf }}'],
  },
  reason: 'You get this mail because you sat a paper.',
  holdsKey: false,
} as const;

/**
 * Letters about a sitting. `bySubject` may hold a line a subject, `name<tab>4 of 5`;
 * `appealBy` and `maySitAgainOn` are left out where there is none.
 */
export const resultLetters = {
  'result-passed': {
    ...sat,
    preview: 'The result by subject is on your record.',
    heading: 'Passed, {{ marks }} of {{ outOf }}',
    tone: 'good',
    before: [
      '{{ givenName }}, that is {{ percent }} %. Your certificate is being drawn and signed; it follows in a mail of its own.',
    ],
    button: { label: 'See the result', url: '{{ url }}' },
    after: ['{% if appealBy %}Think a mark is wrong? Appeal by {{ appealBy }}.{% endif %}'],
  },
  'result-not-passed': {
    ...sat,
    preview: 'Your result and what to practise before the next sitting.',
    heading: 'Not passed, {{ marks }} of {{ outOf }}',
    tone: 'plain',
    before: [
      '{{ givenName }}, that is {{ percent }} %. The result by subject says what to practise; practice stays open.',
      '{% if maySitAgainOn %}You may sit again from {{ maySitAgainOn }}.{% endif %}',
    ],
    button: { label: 'See what to practise', url: '{{ url }}' },
    after: ['{% if appealBy %}Think a mark is wrong? Appeal by {{ appealBy }}.{% endif %}'],
  },
} satisfies Record<string, LetterTemplate>;
