import { render, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { LessonText } from './lesson-text.tsx';
import { type LessonView } from './queries.ts';

const math = (value: string) => ({
  type: 'root' as const,
  children: [
    {
      type: 'element',
      tagName: 'math',
      properties: {},
      children: [
        { type: 'element', tagName: 'mi', properties: {}, children: [{ type: 'text', value }] },
      ],
    },
  ],
});

const lesson = (body: string, more: Partial<LessonView> = {}): LessonView => ({
  number: '3.4',
  slug: 'the-long-run',
  title: 'The long run',
  revision: 'B',
  issued: '2026-11-02',
  language: 'en',
  unit: { number: 3, title: 'Voltage drop' },
  author: 'O. Marchetti',
  checkedBy: 'R. Nakamura',
  minutes: 14,
  lead: '',
  can: [],
  objectives: [],
  needs: [],
  headings: [],
  terms: [],
  drawings: {},
  paragraphs: 3,
  words: [],
  sources: [],
  recall: [],
  formulas: {},
  figures: {},
  worked: {},
  tries: [],
  previous: null,
  next: null,
  body,
  ...more,
});

const draw = (body: string, more?: Partial<LessonView>) =>
  render(<LessonText lesson={lesson(body, more)} />).container;

const rowOf = (text: RegExp) => screen.getByText(text).closest('.sheet-row');

it('numbers top-level paragraphs only, and a heading shares the number below it', () => {
  draw(
    'First.\n\n- a list\n\n## Measure\n\nSecond.\n\n:::hazard{level="warning" title="Short"}\nOff.\n:::\n\nThird.',
  );
  expect(rowOf(/First/)).toHaveAttribute('id', 'p1');
  expect(rowOf(/a list/)).toHaveAttribute('id', 'p1');
  expect(rowOf(/Measure/)).toHaveAttribute('id', 'p2');
  expect(rowOf(/Third/)).toHaveAttribute('id', 'p3');
});

it('puts cautions and notes level with the paragraph they follow', () => {
  draw('First.\n\n:::hazard{level="warning" title="Battery"}\nRings off.\n:::\n\nSecond.');
  const note = screen.getByRole('note');
  expect(note).toHaveTextContent(/WARNING.*Battery.*Rings off/);
  expect(note.closest('.sheet-row')).toHaveAttribute('id', 'p1');
});

it('explains a word beside the first paragraph that uses it', () => {
  draw('Nothing yet.\n\nThe pair is out and back.', {
    words: [{ term: 'pair', meaning: 'both conductors' }],
  });
  expect(screen.getByText(/both conductors/).closest('.sheet-row')).toHaveAttribute('id', 'p2');
});

it('draws formulas from the tree that came with the lesson', () => {
  const page = draw('Take $R$ first:\n\n$$\nR = 2\n$$\n\nThen go on.', {
    formulas: { R: math('R'), 'R = 2': math('S') },
  });
  expect(page.querySelectorAll('math')).toHaveLength(2);
  expect(page.querySelector('.formula math')).toHaveTextContent('S');
  expect(rowOf(/Then go on/)).toHaveAttribute('id', 'p2');
});

it('names a figure by its short description and keeps the long one in words', () => {
  draw(
    '::::figure{src="fig-1.svg" short="The run drawn out straight"}\nThe *run*.\n\n:::description\nNot drawn twice.\n:::\n::::',
    {
      figures: {
        'fig-1.svg': {
          tree: { type: 'root', children: [] },
          narrow: null,
          short: 'The run drawn out straight',
          long: 'Battery, fuse, lamp.',
        },
      },
    },
  );
  expect(screen.getByRole('img', { name: 'The run drawn out straight' })).toBeInTheDocument();
  expect(screen.getByText('Fig. 1')).toBeVisible();
  expect(screen.getByText('Battery, fuse, lamp.')).toBeInTheDocument();
  expect(screen.queryByText(/Not drawn twice/)).toBeNull();
});

it('never draws raw HTML and keeps where an ordered list starts', () => {
  const page = draw('Text <b onclick="x()">bold</b>.\n\n4. four\n5. five');
  expect(page.querySelector('[onclick]')).toBeNull();
  expect(page.querySelector('ol')).toHaveAttribute('start', '4');
});
