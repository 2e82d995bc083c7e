import { render } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { expect, it } from 'vitest';
import { makeLesson } from '../../testing/lesson.ts';
import { LessonText } from './lesson-text.tsx';

const terms = [
  { term: 'drop', means: 'volts lost', forms: ['drop', 'loss'] },
  { term: 'voltage drop', means: 'volts lost along a run', forms: ['voltage drop'] },
];

function wordsOf(body: string): (string | null)[] {
  const { container } = render(
    <MemoryRouter>
      <LessonText lesson={makeLesson({ body, terms })} />
    </MemoryRouter>,
  );
  return [...container.querySelectorAll('.term > button')].map(({ textContent }) => textContent);
}

it('takes the longer of two terms that begin together, and each once', () => {
  expect(wordsOf('The drop-in joint.\n\n*Voltage drop* is a loss. A drop.')).toEqual([
    'Voltage drop',
    'loss',
  ]);
});

it('leaves headings, code, links, parts of words and joined words alone', () => {
  expect(wordsOf('## The drop\n\nDroplets, `drop` and [drop](/tables), then a loss.')).toEqual([
    'loss',
  ]);
});

it('keeps the text as it was written', () => {
  const { container } = render(
    <MemoryRouter>
      <LessonText lesson={makeLesson({ body: 'Voltage drop, twice: a drop.', terms: [] })} />
      <LessonText lesson={makeLesson({ body: 'Voltage drop, twice: a drop.' })} />
    </MemoryRouter>,
  );
  const [plain, marked] = [...container.querySelectorAll('.prose')];
  expect(marked?.textContent).toBe(plain?.textContent);
});
